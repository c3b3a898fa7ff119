import { Box, Grid, Stack } from '@chakra-ui/react';
import type { Chain, Treatment } from '@halfpitch/contracts';
import { useQueryClient } from '@tanstack/react-query';
import { useSession } from '../../app/session';
import { ChoiceTiles } from '../../components/fields/choice-tiles';
import { DateField } from '../../components/fields/date-field';
import { TextField } from '../../components/fields/text-field';
import { Form } from '../../components/form';
import { SubmitButton } from '../../components/submit-button';
import { postTreatment } from './api/treatments';
import { CautionsOfKind } from './cautions-of-kind';
import { kindChoices } from './kind-choices';
import { ReadingFields } from './reading-fields';
import { treatmentForm } from './treatment-form';

const arrivals = [
  { value: 'quiet', label: 'Quiet', hint: 'runs smooth and silent' },
  { value: 'turning', label: 'Turning', hint: 'drying, faint noise' },
  { value: 'dry', label: 'Dry', hint: 'squeals, or shows rust' },
  { value: 'not-seen', label: 'Not seen', hint: 'came off the bike' },
];

interface TreatmentSheetProps {
  chain: Chain;
  onRecorded: (treatment: Treatment) => void;
}

/** One page for gloves: what is done, how the chain arrived, what was measured. */
export function TreatmentSheet({ chain, onRecorded }: TreatmentSheetProps) {
  const { today } = useSession().workshop;
  const client = useQueryClient();
  const kinds = kindChoices(chain.regime);
  return (
    <Form
      schema={treatmentForm}
      defaultValues={{
        chainId: chain.id,
        day: today,
        kind: kinds[0]?.value,
        notes: '',
        reading: { method: 'none', values: [null], step: null },
      }}
      onSubmit={async (input) => {
        onRecorded(await postTreatment(input));
        for (const queryKey of [['treatments'], ['reminders'], ['readings']])
          void client.invalidateQueries({ queryKey });
      }}
    >
      <Grid templateColumns={{ base: '1fr', xl: 'minmax(0, 1fr) 24rem' }} gap="8">
        <Stack gap="8" maxWidth="48rem">
          <ChoiceTiles name="kind" label="What you do" options={kinds} minTileWidth="10rem" />
          <Box hideFrom="xl">
            <CautionsOfKind regime={chain.regime} />
          </Box>
          <ChoiceTiles name="arrival" label="How the chain arrived" options={arrivals} minTileWidth="9rem" />
          <ReadingFields />
          <TextField name="notes" label="Notes" help="What the next mechanic should know." lines={2} />
          <DateField name="day" label="Day" max={today} min={chain.inServiceOn} required />
          <SubmitButton size="lg" width={{ base: 'full', md: 'auto' }} alignSelf="flex-start">
            Record the treatment
          </SubmitButton>
        </Stack>
        <Box hideBelow="xl">
          <Box position="sticky" top="6">
            <CautionsOfKind regime={chain.regime} />
          </Box>
        </Box>
      </Grid>
    </Form>
  );
}
