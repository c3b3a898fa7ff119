import { Stack } from '@chakra-ui/react';
import type { Chain, ReadingMethod } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { useNavigate, useParams } from 'react-router-dom';
import { useSession } from '../../app/session';
import { DateField } from '../../components/fields/date-field';
import { Form } from '../../components/form';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { Panel } from '../../components/panel';
import { SubmitButton } from '../../components/submit-button';
import { chainQuery } from '../chains/api/chain';
import { readingsQuery } from './api/readings';
import { BaselineField } from './baseline-field';
import { EntryFields } from './entry-fields';
import { HowToMeasure } from './how-to-measure';
import { LiveRule } from './live-rule';
import { entriesOf, MOST_PLACES, readingForm } from './reading-form';
import { ToolFields } from './tool-fields';
import { useEnterReading } from './use-enter-reading';

const each = <T,>(value: T): T[] => Array.from({ length: MOST_PLACES }, () => value);

function ReadingFormView({ chain, method }: { chain: Chain; method: ReadingMethod }) {
  const { today } = useSession().workshop;
  const navigate = useNavigate();
  const enter = useEnterReading();
  return (
    <Form
      schema={readingForm}
      defaultValues={{
        chainId: chain.id,
        day: today,
        baseline: false,
        notes: '',
        method,
        entry: entriesOf[method][0],
        pitches: 24,
        inches: each(''),
        places: each(null),
        goes: '',
        stops: '',
      }}
      onSubmit={async (input) => {
        await enter(input, chain.label);
        await navigate(`/chains/${chain.id}`, { replace: true });
      }}
    >
      <ToolFields />
      <Stack gap="6">
        <Panel title="How to measure">
          <HowToMeasure />
        </Panel>
        <Panel title="What it shows">
          <Stack gap="6">
            <EntryFields />
            <LiveRule chain={chain} />
          </Stack>
        </Panel>
      </Stack>
      <DateField name="day" label="Measured on" min={chain.inServiceOn} max={today} />
      <BaselineField />
      <SubmitButton size="lg" width={{ base: 'full', sm: 'auto' }} alignSelf="flex-start">
        Save the reading
      </SubmitButton>
    </Form>
  );
}

/** Enters what a chain checker shows; the tool used last is chosen already. */
export function NewReading() {
  const { id = '' } = useParams();
  const chain = useQuery(chainQuery(id));
  const last = useQuery(readingsQuery(id, 1, 1));
  return (
    <>
      <PageHeader title="Enter a reading" lead={chain.data?.label} />
      <Loaded query={chain}>
        {(found) => (
          <Loaded query={last}>
            {({ items }) => <ReadingFormView chain={found} method={items[0]?.method ?? 'steel-rule'} />}
          </Loaded>
        )}
      </Loaded>
    </>
  );
}
