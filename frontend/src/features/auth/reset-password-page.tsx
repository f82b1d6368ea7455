import { chakra } from '@chakra-ui/react';
import { Form, Formik } from 'formik';
import { Link, useLocation } from 'react-router-dom';
import { object } from 'yup';
import { problemOf } from '../../api/problem';
import { Button } from '../../components/button';
import { FormField } from '../../components/form-field';
import { FormRefusal } from '../../components/form-refusal';
import { AuthFrame } from './auth-frame';
import { tokenOfFragment } from './fragment-token';
import { IncompleteLink } from './incomplete-link';
import { newPassword, repeatedPassword } from './password-rules';
import { useResetPassword } from './requests/reset-password';

const schema = object({ password: newPassword, repeated: repeatedPassword });

export function Component() {
  const token = tokenOfFragment(useLocation().hash);
  const reset = useResetPassword();
  if (token === '') {
    return (
      <IncompleteLink title="This link cannot be used">
        <Link to="/forgotten-password">Ask for another link</Link>
      </IncompleteLink>
    );
  }
  if (reset.isSuccess) {
    return (
      <AuthFrame title="The new password holds" lead="Every other sign-in of yours has been ended.">
        <Link to="/sign-in">Sign in with it</Link>
      </AuthFrame>
    );
  }
  return (
    <AuthFrame title="Choose a new password">
      <Formik
        validateOnBlur={false}
        initialValues={{ password: '', repeated: '' }}
        validationSchema={schema}
        onSubmit={({ password }) => reset.mutateAsync({ token, password }).catch(() => undefined)}
      >
        {({ isSubmitting }) => (
          <chakra.div css={{ '& > form': { display: 'grid', gap: 4 } }}>
            <Form noValidate>
              {reset.isError && <FormRefusal error={reset.error} />}
              <FormField
                name="password"
                label="New password"
                type="password"
                autoComplete="new-password"
                refusal={reset.isError ? problemOf(reset.error).at('/password') : undefined}
              />
              <FormField name="repeated" label="Once more" type="password" autoComplete="new-password" />
              <Button type="submit" variant="solid" disabled={isSubmitting}>
                Keep this password
              </Button>
            </Form>
          </chakra.div>
        )}
      </Formik>
      {reset.isError && (
        <chakra.p mt={4} fontSize="sm">
          <Link to="/forgotten-password">Ask for another link</Link>
        </chakra.p>
      )}
    </AuthFrame>
  );
}
