import { Box, Button, Code, Stack, Text } from '@chakra-ui/react';
import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useFormat } from '../../app/use-format';
import { ChoiceTiles } from '../../components/fields/choice-tiles';
import { DateField } from '../../components/fields/date-field';
import { TextField } from '../../components/fields/text-field';
import { Form } from '../../components/form';
import { Panel } from '../../components/panel';
import { SubmitButton } from '../../components/submit-button';
import { addToken, tokensQuery } from './api/tokens';
import { tokenForm, tokenUses } from './token-form';

const uses = Object.entries(tokenUses).map(([value, { label, hint }]) => ({ value, label, hint }));

/** The one time the secret is seen. */
function Secret({ secret, onKept }: { secret: string; onKept: () => void }) {
  return (
    <Stack role="status" gap="3" align="flex-start">
      <Text>Copy the token now: it is not shown again. Whoever has it can do what you allowed.</Text>
      <Code size="lg" p="3" overflowWrap="anywhere" whiteSpace="normal">
        {secret}
      </Code>
      <Text color="fg.muted">
        Send it with each call as the header “Authorization: Bearer …”. The calls are listed at /api/docs.
      </Text>
      <Button onClick={onKept}>I have copied it</Button>
    </Stack>
  );
}

/** Makes a token and shows its secret once. */
export function NewToken() {
  const client = useQueryClient();
  const { today } = useFormat();
  const [secret, setSecret] = useState<string>();
  return (
    <Panel title="New token">
      {secret ? (
        <Secret secret={secret} onKept={() => setSecret(undefined)} />
      ) : (
        <Box maxWidth="30rem">
          <Form
            schema={tokenForm}
            defaultValues={{ name: '', use: 'rides', lastDay: null }}
            onSubmit={async (values) => {
              const made = await addToken(values);
              await client.invalidateQueries({ queryKey: tokensQuery.queryKey });
              setSecret(made.secret);
            }}
          >
            <TextField name="name" label="What is it for?" autoComplete="off" />
            <ChoiceTiles name="use" label="It may" options={uses} />
            <DateField name="lastDay" label="Last day (empty: no end)" min={today} />
            <SubmitButton alignSelf="flex-start">Make the token</SubmitButton>
          </Form>
        </Box>
      )}
    </Panel>
  );
}
