import { List, Text } from '@chakra-ui/react';
import type { EstimationModel } from '@halfpitch/contracts';
import type { UseQueryResult } from '@tanstack/react-query';
import { Loaded } from '../../components/loaded';
import { Panel } from '../../components/panel';
import { LearnedRates } from './learned-rates';

/** What readings say, how they err, and when a chain is replaced. Limits by speeds: common practice. */
export function HowElongation({ model }: { model: UseQueryResult<EstimationModel> }) {
  return (
    <Panel title="3. How far the chain has lengthened">
      <Text mb="3">
        A chain does not stretch: its pins and bushings wear, and each half-inch pitch grows a little. Every
        reading is weighed by how exact its tool is:
      </Text>
      <List.Root ps="5" gap="1" mb="3">
        <List.Item>
          <strong>Three-point and digital gauges</strong> and the <strong>steel rule</strong> measure pin to
          pin.
        </List.Item>
        <List.Item>
          <strong>Two-point and drop-in gauges</strong> push the rollers apart, so their play is added to what
          they show; we take about a tenth of a percent off, more or less sure.
        </List.Item>
        <List.Item>
          <strong>A drop-in gauge</strong> only tells between which two steps the chain lies.
        </List.Item>
      </List.Root>
      <Text mb="3">
        A worn chain never gets shorter. A reading that says so is kept, but doubted, and weighs less. Between
        readings, the chain’s own wear for each counted kilometre carries the estimate on.
      </Text>
      <Loaded query={model} rows={3} height="2.5rem">
        {({ rates }) => <LearnedRates rates={rates} />}
      </Loaded>
      <Text mt="4">
        A chain is due for replacement at its limit: 0.5 % from 11 speeds, 0.75 % from 6 to 10, 1.0 % below,
        unless another is set for it. Beyond that it wears the sprockets.
      </Text>
    </Panel>
  );
}
