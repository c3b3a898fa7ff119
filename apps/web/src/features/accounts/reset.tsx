import { Link } from '@chakra-ui/react';
import { password } from '@halfpitch/contracts';
import { Link as RouterLink, useNavigate, useParams } from 'react-router-dom';
import { z } from 'zod';
import { Form } from '../../components/form';
import { PageHeader } from '../../components/page-header';
import { SubmitButton } from '../../components/submit-button';
import { postReset } from './calls';
import { NewPasswordField } from './new-password-field';

const schema = z.object({ password });

/** Where the letter's link leads. */
export function Reset() {
  const { token = '' } = useParams();
  const navigate = useNavigate();
  return (
    <>
      <PageHeader
        title="Choose a new password"
        lead="You are then signed out everywhere and sign in with it."
      />
      <Form
        schema={schema}
        defaultValues={{ password: '' }}
        onSubmit={async (values) => {
          await postReset(token, values.password);
          await navigate('/sign-in', { replace: true, state: { hasNewPassword: true } });
        }}
      >
        <NewPasswordField label="New password" />
        <SubmitButton>Set the password</SubmitButton>
        <Link asChild alignSelf="flex-start">
          <RouterLink to="/forgot">Ask for another link</RouterLink>
        </Link>
      </Form>
    </>
  );
}
