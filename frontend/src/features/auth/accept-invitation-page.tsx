import { chakra } from '@chakra-ui/react';
import { Form, Formik } from 'formik';
import { Link, useSearchParams } from 'react-router-dom';
import { object, string } from 'yup';
import { problemOf } from '../../api/problem';
import { Button } from '../../components/button';
import { FormField } from '../../components/form-field';
import { FormRefusal } from '../../components/form-refusal';
import { AuthFrame } from './auth-frame';
import { newPassword, repeatedPassword } from './password-rules';
import { useAcceptInvitation } from './requests/accept-invitation';

const schema = object({
  name: string()
    .trim()
    .required('Enter your name as colleagues know it.')
    .max(200, 'At most 200 characters.'),
  password: newPassword,
  repeated: repeatedPassword,
});

export function Component() {
  const [parameters] = useSearchParams();
  const token = parameters.get('token') ?? '';
  const accept = useAcceptInvitation();
  const refusal = accept.isError ? problemOf(accept.error) : undefined;
  if (accept.isSuccess) {
    return (
      <AuthFrame title="Welcome" lead="Your account is ready.">
        <Link to="/sign-in">Sign in</Link>
      </AuthFrame>
    );
  }
  return (
    <AuthFrame title="Accept the invitation" lead="Say who you are and choose a password.">
      <Formik
        initialValues={{ name: '', password: '', repeated: '' }}
        validationSchema={schema}
        onSubmit={({ name, password }) =>
          accept.mutateAsync({ token, name: name.trim(), password }).catch(() => undefined)
        }
      >
        {({ isSubmitting }) => (
          <chakra.div css={{ '& > form': { display: 'grid', gap: 4 } }}>
            <Form noValidate>
              {accept.isError && <FormRefusal error={accept.error} />}
              <FormField name="name" label="Name" autoComplete="name" refusal={refusal?.at('/name')} />
              <FormField
                name="password"
                label="Password"
                type="password"
                autoComplete="new-password"
                refusal={refusal?.at('/password')}
              />
              <FormField name="repeated" label="Once more" type="password" autoComplete="new-password" />
              <Button type="submit" variant="solid" disabled={isSubmitting}>
                Open the account
              </Button>
            </Form>
          </chakra.div>
        )}
      </Formik>
    </AuthFrame>
  );
}
