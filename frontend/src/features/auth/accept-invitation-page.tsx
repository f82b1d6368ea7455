import { chakra } from '@chakra-ui/react';
import { Form, Formik } from 'formik';
import { Link, useLocation } from 'react-router-dom';
import { object, string } from 'yup';
import { problemOf } from '../../api/problem';
import { Button } from '../../components/button';
import { FormField } from '../../components/form-field';
import { FormRefusal } from '../../components/form-refusal';
import { Failed, Loading } from '../../components/states';
import { roleWords } from '../../wording/role-words';
import { AuthFrame } from './auth-frame';
import { tokenOfFragment } from './fragment-token';
import { IncompleteLink } from './incomplete-link';
import { newPassword, repeatedPassword } from './password-rules';
import { useAcceptInvitation } from './requests/accept-invitation';
import { useInvitationPreview } from './requests/preview-invitation';

const schema = object({
  name: string()
    .trim()
    .required('Enter your name as colleagues know it.')
    .max(100, 'At most 100 characters.'),
  password: newPassword,
  repeated: repeatedPassword,
});

export function Component() {
  const token = tokenOfFragment(useLocation().hash);
  const preview = useInvitationPreview(token);
  const accept = useAcceptInvitation();
  const refusal = accept.isError ? problemOf(accept.error) : undefined;
  if (accept.isSuccess) {
    return (
      <AuthFrame title="Welcome" lead="Your account is ready.">
        <Link to="/sign-in">Sign in</Link>
      </AuthFrame>
    );
  }
  if (token === '') return <IncompleteLink title="This invitation cannot be read" />;
  if (preview.isPending) {
    return (
      <AuthFrame title="Accept the invitation">
        <Loading label="Reading the invitation" lines={3} />
      </AuthFrame>
    );
  }
  if (preview.isError) {
    return (
      <AuthFrame title="This invitation cannot be used">
        <Failed error={preview.error} onRetry={() => void preview.refetch()} />
        <Link to="/sign-in">To sign-in</Link>
      </AuthFrame>
    );
  }
  const roles = preview.data.roles.map((role) => roleWords[role]).join(', ');
  return (
    <AuthFrame title="Accept the invitation" lead={`For ${preview.data.email}, as ${roles}.`}>
      <Formik
        validateOnBlur={false}
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
