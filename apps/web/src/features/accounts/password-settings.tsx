import { Heading } from '@chakra-ui/react';
import { changePassword } from '@halfpitch/contracts';
import { useState } from 'react';
import { TextField } from '../../components/fields/text-field';
import { Form } from '../../components/form';
import { SubmitButton } from '../../components/submit-button';
import { toastDone } from '../../components/toaster';
import { putPassword } from './calls';
import { NewPasswordField } from './new-password-field';

/** Changing the password ends every other session. */
export function PasswordSettings() {
  const [changes, setChanges] = useState(0);
  return (
    <section aria-labelledby="password">
      <Heading as="h2" size="lg" id="password" mb="4">
        Change the password
      </Heading>
      <Form
        key={changes}
        schema={changePassword}
        defaultValues={{ current: '', password: '' }}
        onSubmit={async (values) => {
          await putPassword(values);
          setChanges(changes + 1);
          toastDone('The password is changed. Other devices are signed out.');
        }}
      >
        <TextField name="current" label="Present password" type="password" autoComplete="current-password" />
        <NewPasswordField label="New password" />
        <SubmitButton alignSelf="flex-start">Change it</SubmitButton>
      </Form>
    </section>
  );
}
