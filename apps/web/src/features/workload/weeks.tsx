import { Button, Flex, Grid, Link, Stack, Text } from '@chakra-ui/react';
import type { Workload } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { Printer } from 'lucide-react';
import { lazy } from 'react';
import { Link as RouterLink } from 'react-router-dom';
import { useFormat } from '../../app/use-format';
import { ChartFrame } from '../../components/chart-frame';
import { EmptyState } from '../../components/empty-state';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { useUrlState } from '../../components/use-url-state';
import { workloadQuery } from './api/workload';
import { WeekChains } from './week-chains';
import { WeekTable } from './week-table';
import { benchSummary, comingSummary, countSummary, weekWords } from './week-words';

const CountChart = lazy(() => import('./count-chart'));
const MinutesChart = lazy(() => import('./minutes-chart'));

const parts = (what: string) => [`${what}: low`, `${what}: middle`, `${what}: high`];

function TwelveWeeks({ load }: { load: Workload }) {
  const { today } = useFormat();
  const [chosen, choose] = useUrlState('week', load.weeks[0]?.from);
  const week = load.weeks.find(({ from }) => from === chosen) ?? load.weeks[0];
  const bandsOf = (...bands: { p10: number; p50: number; p90: number }[]) =>
    bands.flatMap(({ p10, p50, p90 }) => [p10, p50, p90]);
  return (
    <Stack gap="10">
      <Grid templateColumns={{ base: '1fr', xl: '1fr 1fr' }} gap="10">
        <ChartFrame
          title="Treatments and replacements"
          summary={countSummary(load)}
          fileName="weeks-ahead"
          table={{
            head: ['Week', ...parts('Treatments'), ...parts('Replacements')],
            rows: load.weeks.map((one) => [
              weekWords(one, today),
              ...bandsOf(one.treatments, one.replacements),
            ]),
          }}
        >
          <CountChart weeks={load.weeks} />
        </ChartFrame>
        <ChartFrame
          title="Bench minutes"
          summary={benchSummary(load, today)}
          fileName="bench-minutes-ahead"
          table={{
            head: ['Week', ...parts('Minutes'), 'There are'],
            rows: load.weeks.map((one) => [
              weekWords(one, today),
              ...bandsOf(one.benchMinutes),
              load.minutesPerWeek,
            ]),
          }}
        >
          <MinutesChart load={load} />
        </ChartFrame>
      </Grid>
      <Text color="fg.muted" maxWidth="52rem">
        {comingSummary(load.coming)}
      </Text>
      <Grid templateColumns={{ base: '1fr', xl: 'max-content minmax(0, 1fr)' }} gap="10" alignItems="start">
        <WeekTable load={load} chosen={week?.from} onChoose={choose} />
        {week && <WeekChains week={week} />}
      </Grid>
    </Stack>
  );
}

/** The owner's Monday: the work that is coming, how sure it is, and who makes it up. */
export function Weeks() {
  const query = useQuery(workloadQuery);
  return (
    <>
      <PageHeader
        title="The week ahead"
        lead="The coming twelve weeks, with the band each figure falls in with a chance of 80 %."
        actions={
          <Flex gap="5" align="center" className="no-print">
            <Link asChild>
              <RouterLink to="/accuracy">How right we were</RouterLink>
            </Link>
            <Button variant="outline" onClick={() => window.print()}>
              <Printer size={20} aria-hidden="true" />
              Print
            </Button>
          </Flex>
        }
      />
      <Loaded query={query} rows={2} height="22rem">
        {(load) =>
          load.weeks.every(({ chains }) => chains.length === 0) ? (
            <EmptyState title="No work is in sight yet">
              It shows as soon as riders have chains in service and rides are logged.
            </EmptyState>
          ) : (
            <TwelveWeeks load={load} />
          )
        }
      </Loaded>
    </>
  );
}
