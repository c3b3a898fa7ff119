import { accountChange } from '@halfpitch/contracts';
import { useQueryClient } from '@tanstack/react-query';
import { useSession } from '../../app/session';
import { sessionKey } from '../../app/session-key';
import { ChoiceTiles } from '../../components/fields/choice-tiles';
import { TextField } from '../../components/fields/text-field';
import { Form } from '../../components/form';
import { SubmitButton } from '../../components/submit-button';
import { toastDone } from '../../components/toaster';
import { putAccount } from './calls';

const units = [
  { value: 'km', label: 'Kilometres' },
  { value: 'mi', label: 'Miles' },
];

export function PersonSettings() {
  const { account, preferences } = useSession();
  const client = useQueryClient();
  return (
    <Form
      schema={accountChange}
      defaultValues={{ name: account.name, distanceUnit: preferences.distanceUnit }}
      onSubmit={async (values) => {
        await putAccount(values);
        await client.invalidateQueries({ queryKey: sessionKey });
        toastDone('Saved.');
      }}
    >
      <TextField name="name" label="Your name" autoComplete="name" />
      <ChoiceTiles name="distanceUnit" label="Distances in" options={units} />
      <SubmitButton alignSelf="flex-start">Save</SubmitButton>
    </Form>
  );
}
