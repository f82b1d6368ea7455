import { chakra } from '@chakra-ui/react';
import { Formik } from 'formik';
import { object, string } from 'yup';
import { problemOf } from '../../api/problem';
import { Button } from '../../components/button';
import { DoneNotice } from '../../components/done-notice';
import { FormField } from '../../components/form-field';
import { FormRefusal } from '../../components/form-refusal';
import { StackedForm } from '../../components/stacked-form';
import { useRenameSelf } from './requests/rename-self';

const schema = object({
  name: string()
    .trim()
    .required('Enter your name as colleagues know it.')
    .max(100, 'At most 100 characters.'),
});

/** The name under which colleagues see what one has done. */
export function NameForm({ name }: { name: string }) {
  const rename = useRenameSelf();
  return (
    <Formik
      validateOnBlur={false}
      initialValues={{ name }}
      validationSchema={schema}
      onSubmit={(values) => rename.mutateAsync(values.name.trim()).catch(() => undefined)}
    >
      {({ isSubmitting }) => (
        <StackedForm>
          {rename.isError && <FormRefusal error={rename.error} />}
          <FormField
            name="name"
            label="Name"
            autoComplete="name"
            refusal={rename.isError ? problemOf(rename.error).at('/name') : undefined}
          />
          {rename.isSuccess && <DoneNotice>The name is changed.</DoneNotice>}
          <chakra.div>
            <Button type="submit" disabled={isSubmitting}>
              Change the name
            </Button>
          </chakra.div>
        </StackedForm>
      )}
    </Formik>
  );
}
