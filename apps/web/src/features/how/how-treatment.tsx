import { List, Text } from '@chakra-ui/react';
import { regimes } from '@halfpitch/contracts';
import type { EstimationModel, WorkshopSettings } from '@halfpitch/contracts';
import type { UseQueryResult } from '@tanstack/react-query';
import { Loaded } from '../../components/loaded';
import { Panel } from '../../components/panel';
import { regimeWords } from '../../components/trade-words';
import { LearnedLives } from './learned-lives';

interface HowTreatmentProps {
  limits: WorkshopSettings['calendarLimitDays'];
  model: UseQueryResult<EstimationModel>;
}

/** How long a treatment lasts, and how arrivals teach it. */
export function HowTreatment({ limits, model }: HowTreatmentProps) {
  const limited = regimes.filter((regime) => limits[regime] !== null);
  return (
    <Panel title="2. How long a treatment lasts is learned at the bench">
      <Text mb="3">
        We start from what such a treatment usually lasts. Each time a chain arrives, the mechanic notes how:
      </Text>
      <List.Root ps="5" gap="1" mb="3">
        <List.Item>
          <strong>Quiet</strong>: the treatment had not run out yet; it lasts longer than the distance ridden.
        </List.Item>
        <List.Item>
          <strong>Turning</strong>: it was just running out.
        </List.Item>
        <List.Item>
          <strong>Dry</strong>: it had run out before.
        </List.Item>
      </List.Root>
      <Text mb="3">
        From many such arrivals we learn what a treatment really lasts on this rider’s roads. With few of
        them, what the workshop’s other riders show counts for more. An arrival that no treatment’s life can
        explain is doubted, and counts for little.
      </Text>
      <Loaded query={model} rows={5} height="2.5rem">
        {(learned) => <LearnedLives model={learned} />}
      </Loaded>
      {limited.length > 0 && (
        <Text mt="3">
          However little is ridden, it is redone after{' '}
          {limited
            .map((regime) => `${limits[regime]} days (${regimeWords[regime].toLowerCase()})`)
            .join(', ')}{' '}
          at the latest.
        </Text>
      )}
    </Panel>
  );
}
