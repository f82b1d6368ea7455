import { chakra } from '@chakra-ui/react';
import { Form, Formik } from 'formik';
import { object, string } from 'yup';
import { Button } from '../../components/button';
import { FormField } from '../../components/form-field';
import { FormRefusal } from '../../components/form-refusal';
import { useSignIn } from './requests/sign-in';

const schema = object({
  email: string().trim().required('Enter your e-mail address.').email('This is not an e-mail address.'),
  password: string().required('Enter your password.'),
});

export interface SignInFormProps {
  /** Given where the same person signs in again. */
  email?: string;
  onSignedIn?: () => void;
}

/** E-mail and password. What was entered stays after a refusal. */
export function SignInForm({ email = '', onSignedIn }: SignInFormProps) {
  const signIn = useSignIn();
  return (
    <Formik
      validateOnBlur={false}
      initialValues={{ email, password: '' }}
      validationSchema={schema}
      onSubmit={(values) =>
        signIn.mutateAsync({ ...values, email: values.email.trim() }).then(onSignedIn, () => undefined)
      }
    >
      {({ isSubmitting }) => (
        <chakra.div css={{ '& > form': { display: 'grid', gap: 4 } }}>
          <Form noValidate>
            {signIn.isError && <FormRefusal error={signIn.error} unauthenticated="Not signed in" />}
            <FormField name="email" label="E-mail" type="email" autoComplete="username" />
            <FormField name="password" label="Password" type="password" autoComplete="current-password" />
            <Button type="submit" variant="solid" disabled={isSubmitting}>
              {isSubmitting ? 'Signing in' : 'Sign in'}
            </Button>
          </Form>
        </chakra.div>
      )}
    </Formik>
  );
}
