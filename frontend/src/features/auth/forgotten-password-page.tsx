import { chakra } from '@chakra-ui/react';
import { Form, Formik } from 'formik';
import { Link } from 'react-router-dom';
import { object, string } from 'yup';
import { Button } from '../../components/button';
import { FormField } from '../../components/form-field';
import { FormRefusal } from '../../components/form-refusal';
import { AuthFrame } from './auth-frame';
import { useRequestPasswordReset } from './requests/forgotten-password';

const schema = object({
  email: string().trim().required('Enter your e-mail address.').email('This is not an e-mail address.'),
});

export function Component() {
  const request = useRequestPasswordReset();
  if (request.isSuccess) {
    return (
      <AuthFrame
        title="Look into your mail"
        lead={`If ${request.variables} has an account here, a link to choose a new password is on its way to it.`}
      >
        <Link to="/sign-in">Back to sign-in</Link>
      </AuthFrame>
    );
  }
  return (
    <AuthFrame title="Forgotten password" lead="A link to choose a new one comes by mail.">
      <Formik
        validateOnBlur={false}
        initialValues={{ email: '' }}
        validationSchema={schema}
        onSubmit={({ email }) => request.mutateAsync(email.trim()).catch(() => undefined)}
      >
        {({ isSubmitting }) => (
          <chakra.div css={{ '& > form': { display: 'grid', gap: 4 } }}>
            <Form noValidate>
              {request.isError && <FormRefusal error={request.error} />}
              <FormField name="email" label="E-mail" type="email" autoComplete="username" />
              <Button type="submit" variant="solid" disabled={isSubmitting}>
                Send the link
              </Button>
            </Form>
          </chakra.div>
        )}
      </Formik>
      <chakra.p mt={4} fontSize="sm">
        <Link to="/sign-in">Back to sign-in</Link>
      </chakra.p>
    </AuthFrame>
  );
}
