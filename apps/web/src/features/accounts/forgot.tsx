import { Link, Text } from '@chakra-ui/react';
import { forgottenPassword } from '@halfpitch/contracts';
import { useState } from 'react';
import { Link as RouterLink } from 'react-router-dom';
import { Form } from '../../components/form';
import { PageHeader } from '../../components/page-header';
import { SubmitButton } from '../../components/submit-button';
import { TextField } from '../../components/fields/text-field';
import { postForgotten } from './calls';

/** Asks for a letter with a link; the answer is the same whether the address is known or not. */
export function Forgot() {
  const [sentTo, setSentTo] = useState<string | null>(null);
  const back = (
    <Link asChild alignSelf="flex-start">
      <RouterLink to="/sign-in">Back to the sign-in</RouterLink>
    </Link>
  );
  if (sentTo !== null)
    return (
      <>
        <PageHeader title="Look in your mail" />
        <Text role="status" mb="6">
          If {sentTo} has an account, a letter with a link is on its way. The link works once, for one hour.
        </Text>
        {back}
      </>
    );
  return (
    <>
      <PageHeader title="A new password" lead="We send a link to the address you sign in with." />
      <Form
        schema={forgottenPassword}
        defaultValues={{ email: '' }}
        onSubmit={async ({ email }) => {
          await postForgotten(email);
          setSentTo(email);
        }}
      >
        <TextField name="email" label="E-mail" type="email" autoComplete="username" />
        <SubmitButton>Send the link</SubmitButton>
        {back}
      </Form>
    </>
  );
}
