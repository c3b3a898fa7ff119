import { Grid, Stack, Text } from '@chakra-ui/react';
import type { Accuracy } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { EmptyState } from '../../components/empty-state';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { Panel } from '../../components/panel';
import { accuracyQuery } from './api/accuracy';
import { LatestTable } from './latest-table';
import { PartBars } from './part-bars';
import { ScoreTable } from './score-table';
import { horizonWords, judgedWords, verdict } from './score-words';

function Judged({ said }: { said: Accuracy }) {
  const fortnight = said.horizons.find(({ horizon }) => horizon === 'two-weeks')!.score;
  return (
    <Stack gap="10">
      <Grid templateColumns={{ base: '1fr', lg: '1fr 1fr' }} gap="6" alignItems="start">
        <Panel title="In a word">
          <Text textStyle="lg">{verdict(fortnight)}</Text>
          <Text mt="4" color="fg.muted">
            A due day is only known where the chain came in turning. One found quiet was not due yet, one
            found dry had been due before: they prove a window wrong when they lie beyond it, and are left
            open otherwise. Treatments whose date the calendar decided are left out.
          </Text>
        </Panel>
        <Panel title="Where due days fell in their windows">
          <PartBars parts={fortnight.parts} />
          <Text mt="3" color="fg.muted" textStyle="sm">
            The likeliest shares from all {fortnight.cases} windows, those that are left open included.
          </Text>
        </Panel>
      </Grid>
      <ScoreTable
        title="By how long before"
        first="Told"
        rows={said.horizons.map(({ horizon, score }) => ({
          key: horizon,
          name: horizonWords[horizon],
          score,
        }))}
      />
      <ScoreTable
        title="By what was judged, as told two weeks before"
        first="Treatment"
        rows={said.kinds.map(({ kind, score }) => ({ key: kind, name: judgedWords(kind), score }))}
      />
      <LatestTable looks={said.latest} />
    </Stack>
  );
}

/** What was said of chains in the last year, held against what was found. */
export function AccuracyPage() {
  const query = useQuery(accuracyQuery);
  return (
    <>
      <PageHeader
        title="How right we were"
        lead="What was said of each chain in the last year, against what was found when it came in."
      />
      <Loaded query={query} rows={3} height="14rem">
        {(said) =>
          said.horizons.every(({ score }) => score.cases === 0) ? (
            <EmptyState title="Nothing can be judged yet">
              A window is judged when its chain comes in for the next treatment and its arrival condition is
              recorded.
            </EmptyState>
          ) : (
            <Judged said={said} />
          )
        }
      </Loaded>
    </>
  );
}
