import { Stack, Text } from '@chakra-ui/react';
import { odometerInput } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useFormat } from '../../app/use-format';
import { DateField } from '../../components/fields/date-field';
import { DistanceField } from '../../components/fields/distance-field';
import { Form } from '../../components/form';
import { Loaded } from '../../components/loaded';
import { Panel } from '../../components/panel';
import { SubmitButton } from '../../components/submit-button';
import { toastDone } from '../../components/toaster';
import { useChanged } from '../chains/follow-estimate';
import { addOdometer } from './api/add-odometer';
import { odometerQuery } from './api/odometer';
import { OdometerTable } from './odometer-table';

interface OdometerPanelProps {
  bikeId: string;
  /** The chain that is on it, whose estimate follows. */
  chainId: string | null;
}

/** The odometer's figures: they show riding that nobody logged. */
export function OdometerPanel({ bikeId, chainId }: OdometerPanelProps) {
  const { today } = useFormat();
  const [page, setPage] = useState(1);
  const [saved, setSaved] = useState(0);
  const changed = useChanged();
  const readings = useQuery(odometerQuery(bikeId, page));
  return (
    <Panel title="Odometer">
      <Text color="fg.muted" mb="5">
        Two readings show how far the bike went between them. What nobody logged counts too: it is spread over
        the days between.
      </Text>
      <Stack gap="6">
        <Form
          key={saved}
          schema={odometerInput}
          defaultValues={{ day: today }}
          onSubmit={async (values) => {
            await addOdometer(bikeId, values);
            changed(chainId);
            setSaved(saved + 1);
            toastDone('The odometer is noted.');
          }}
        >
          <Stack direction={{ base: 'column', sm: 'row' }} gap="4">
            <DistanceField name="odometerM" label="It shows" />
            <DateField name="day" label="On" max={today} />
          </Stack>
          <SubmitButton variant="outline" alignSelf="flex-start">
            Note it
          </SubmitButton>
        </Form>
        <Loaded query={readings} rows={2} height="3rem">
          {(found) => <OdometerTable bikeId={bikeId} chainId={chainId} found={found} onPage={setPage} />}
        </Loaded>
      </Stack>
    </Panel>
  );
}
