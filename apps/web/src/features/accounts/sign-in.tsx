import { Box, Button, chakra, Flex, Input, Link, Stack } from '@chakra-ui/react';
import { signIn } from '@halfpitch/contracts';
import { Link as RouterLink, useLocation } from 'react-router-dom';
import { FieldFrame } from '../../components/fields/field-frame';
import { PageHeader } from '../../components/page-header';
import { postSignIn } from './calls';
import { useEnter } from './entry';
import { usePlainForm } from './use-plain-form';

/** The first page that most people see. */
export function SignIn() {
  const enter = useEnter();
  const state = useLocation().state as { hasNewPassword?: boolean } | null;
  const { wrong, busy, onSubmit } = usePlainForm(signIn, async (values) => {
    await postSignIn(values);
    await enter();
  });
  return (
    <chakra.form noValidate onSubmit={(event) => void onSubmit(event)}>
      <PageHeader
        title="Sign in"
        lead={state?.hasNewPassword && 'Your new password is set. Sign in with it.'}
      />
      <Stack gap="5">
        {wrong[''] && (
          <Box role="alert" p="4" bg="bg.muted" borderInlineStartWidth="5px" borderColor="fg.error">
            {wrong['']}
          </Box>
        )}
        <FieldFrame label="E-mail" error={wrong.email}>
          <Input name="email" type="email" autoComplete="username" />
        </FieldFrame>
        <FieldFrame label="Password" error={wrong.password}>
          <Input name="password" type="password" autoComplete="current-password" />
        </FieldFrame>
        <Button type="submit" loading={busy} loadingText="Sign in">
          Sign in
        </Button>
        <Flex justify="space-between" wrap="wrap" gap="3">
          <Link asChild>
            <RouterLink to="/forgot">Forgotten the password?</RouterLink>
          </Link>
          <Link asChild>
            <RouterLink to="/register">Register a workshop</RouterLink>
          </Link>
        </Flex>
      </Stack>
    </chakra.form>
  );
}
