import { Box, Button } from '@chakra-ui/react';
import { inviteStaff } from '@halfpitch/contracts';
import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { ChoiceTiles } from '../../components/fields/choice-tiles';
import { TextField } from '../../components/fields/text-field';
import { Form } from '../../components/form';
import { SubmitButton } from '../../components/submit-button';
import { toastDone } from '../../components/toaster';
import { addStaff, staffQuery } from './api/staff';

const roles = [
  { value: 'mechanic', label: 'Mechanic', hint: 'treats and measures' },
  { value: 'desk', label: 'Desk', hint: 'riders and letters' },
  { value: 'owner', label: 'Owner', hint: 'everything' },
];

/** Invites a mechanic, someone for the desk, or another owner by e-mail. */
export function InviteStaff() {
  const client = useQueryClient();
  const [open, setOpen] = useState(false);
  if (!open)
    return (
      <Button mt="4" variant="outline" onClick={() => setOpen(true)}>
        Invite someone
      </Button>
    );
  return (
    <Box mt="4" pt="5" borderTopWidth="1px">
      <Form
        schema={inviteStaff}
        defaultValues={{ name: '', email: '', role: 'mechanic' }}
        onSubmit={async (values) => {
          await addStaff(values);
          await client.invalidateQueries({ queryKey: staffQuery.queryKey });
          toastDone(`An invitation is on its way to ${values.email}.`);
          setOpen(false);
        }}
      >
        <TextField name="name" label="Name" autoComplete="off" />
        <TextField name="email" label="E-mail" type="email" autoComplete="off" />
        <ChoiceTiles name="role" label="Role" options={roles} />
        <SubmitButton alignSelf="flex-start">Send the invitation</SubmitButton>
      </Form>
    </Box>
  );
}
