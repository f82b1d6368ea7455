import { chakra } from '@chakra-ui/react';
import { Form, Formik } from 'formik';
import { object, string } from 'yup';
import { Button } from '../../components/button';
import { FormField } from '../../components/form-field';
import { SelectField } from '../../components/select-field';
import { actionWords, subjectWords } from '../permissions/permission-words';
import { useUsers } from '../users/requests/list-users';
import { auditActions } from './audit-actions';
import type { AuditFilter } from './audit-address';

/** Kinds of things that leave a trail. */
const subjects = [
  'Part',
  'Family',
  'Manufacturer',
  'CompanyPartNumber',
  'Offer',
  'Policy',
  'User',
  'Invitation',
  'OutboxMessage',
  'Backup',
] as const;

const schema = object({
  to: string().test('order', 'Ends before it begins.', function ends(value) {
    const { from } = this.parent as AuditFilter;
    return value === undefined || value === '' || from === '' || from <= value;
  }),
});

const Grid = chakra('div', {
  base: {
    '& > form': {
      display: 'grid',
      gap: 4,
      alignItems: 'end',
      gridTemplateColumns: { base: 'repeat(2, minmax(0, 1fr))', lg: 'repeat(4, minmax(0, 1fr))' },
    },
    mb: 5,
  },
});

export interface AuditFiltersProps {
  filter: AuditFilter;
  onFilter: (filter: AuditFilter) => void;
}

/** What the trail is narrowed to. */
export function AuditFilters({ filter, onFilter }: AuditFiltersProps) {
  const users = useUsers();
  return (
    <Formik
      validateOnBlur={false}
      initialValues={filter}
      enableReinitialize
      validationSchema={schema}
      onSubmit={onFilter}
    >
      {({ values, setFieldValue }) => (
        <Grid role="search" aria-label="Narrow the trail">
          <Form noValidate>
            <FormField name="text" label="Words in it" />
            <SelectField
              label="Who"
              stacked
              value={values.actor}
              options={[
                { value: '', words: 'anybody' },
                ...(users.data ?? []).map(({ id, name }) => ({ value: String(id), words: name })),
              ]}
              onValue={(actor) => void setFieldValue('actor', actor)}
            />
            <SelectField
              label="Action"
              stacked
              value={values.action}
              options={[
                { value: '', words: 'any' },
                ...auditActions.map((action) => ({ value: action, words: actionWords(action) })),
              ]}
              onValue={(action) => void setFieldValue('action', action)}
            />
            <SelectField
              label="Kind of thing"
              stacked
              value={values.subject}
              options={[
                { value: '', words: 'any' },
                ...subjects.map((subject) => ({ value: subject, words: subjectWords(subject) })),
              ]}
              onValue={(subject) => void setFieldValue('subject', subject)}
            />
            <FormField name="id" label="Its number" />
            <FormField name="from" label="From" type="date" />
            <FormField name="to" label="To" type="date" />
            <Button type="submit" variant="solid">
              Show
            </Button>
          </Form>
        </Grid>
      )}
    </Formik>
  );
}
