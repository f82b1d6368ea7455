import { chakra } from '@chakra-ui/react';
import { useField } from 'formik';
import { array, mixed } from 'yup';
import type { Schema } from '../../api/schema';
import { ChoiceGroup } from '../../components/choice-group';
import { roleWords } from '../../wording/role-words';

type Role = Schema<'Role'>;

const roles: readonly Role[] = ['administrator', 'librarian', 'component-engineer', 'designer', 'purchasing'];

export const someRoles = array(mixed<Role>().oneOf(roles).required())
  .required()
  .min(1, 'Choose at least one role.');

/** The roles of a person, as an entry of a Formik form named `roles`. */
export function RoleChoice() {
  const [field, meta, helpers] = useField<Role[]>('roles');
  return (
    <chakra.div>
      <ChoiceGroup
        legend="Roles"
        choices={roles}
        words={roleWords}
        chosen={field.value}
        onChosen={(chosen) => void helpers.setValue(chosen)}
      />
      {meta.touched && meta.error !== undefined && (
        <chakra.p role="alert" fontSize="xs" color="unmet">
          {meta.error}
        </chakra.p>
      )}
    </chakra.div>
  );
}
