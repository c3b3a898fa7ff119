import { Flex, Link } from '@chakra-ui/react';
import { signIn } from '@halfpitch/contracts';
import { Link as RouterLink, useLocation } from 'react-router-dom';
import { Form } from '../../components/form';
import { PageHeader } from '../../components/page-header';
import { SubmitButton } from '../../components/submit-button';
import { TextField } from '../../components/fields/text-field';
import { postSignIn } from './calls';
import { useEnter } from './entry';

export function SignIn() {
  const enter = useEnter();
  const state = useLocation().state as { hasNewPassword?: boolean } | null;
  return (
    <>
      <PageHeader
        title="Sign in"
        lead={state?.hasNewPassword && 'Your new password is set. Sign in with it.'}
      />
      <Form
        schema={signIn}
        defaultValues={{ email: '', password: '' }}
        onSubmit={async (values) => {
          await postSignIn(values);
          await enter();
        }}
      >
        <TextField name="email" label="E-mail" type="email" autoComplete="username" />
        <TextField name="password" label="Password" type="password" autoComplete="current-password" />
        <SubmitButton>Sign in</SubmitButton>
        <Flex justify="space-between" wrap="wrap" gap="3">
          <Link asChild>
            <RouterLink to="/forgot">Forgotten the password?</RouterLink>
          </Link>
          <Link asChild>
            <RouterLink to="/register">Register a workshop</RouterLink>
          </Link>
        </Flex>
      </Form>
    </>
  );
}
