import { Box, chakra, Text } from '@chakra-ui/react';
import type { CsvInspection, CsvRide } from '@halfpitch/ride-files';
import { useFormat } from '../../app/use-format';
import { surfaceWords, weatherWords } from '../../components/trade-words';

const SHOWN_PROBLEMS = 3;

function minutes(seconds: number | null): string {
  if (seconds === null) return '';
  const whole = Math.round(seconds / 60);
  return `${Math.floor(whole / 60)}:${String(whole % 60).padStart(2, '0')} h`;
}

const facts = ({ movingS, surface, weather, sport }: CsvRide) =>
  [minutes(movingS), surface && surfaceWords[surface], weather && weatherWords[weather], sport]
    .filter(Boolean)
    .join(' · ');

/** The first rows of a table as the rides that would come of them, and what would be left out. */
export function TablePreview({ found: { rides, problems } }: { found: CsvInspection }) {
  const { day, distance } = useFormat();
  return (
    <Box fontVariantNumeric="tabular-nums">
      {rides.length > 0 && (
        <chakra.table width="full" borderCollapse="collapse" css={{ '& td, & th': { py: 1.5, pe: 3 } }}>
          <chakra.caption textAlign="start" fontWeight="semibold" pb="1">
            The first rows, as rides
          </chakra.caption>
          <thead>
            <chakra.tr textStyle="sm" color="fg.muted" css={{ '& th': { textAlign: 'start' } }}>
              <th scope="col">Day</th>
              <th scope="col">Distance</th>
              <th scope="col">Also</th>
            </chakra.tr>
          </thead>
          <tbody>
            {rides.map((ride) => (
              <chakra.tr key={ride.line} borderTopWidth="1px">
                <td>{day(ride.date)}</td>
                <td>{distance(ride.distanceM)}</td>
                <td>{facts(ride)}</td>
              </chakra.tr>
            ))}
          </tbody>
        </chakra.table>
      )}
      {problems.slice(0, SHOWN_PROBLEMS).map(({ line, message }) => (
        <Text key={line} color="fg.muted" textStyle="sm" mt="2" overflowWrap="anywhere">
          Line {line}: {message}
        </Text>
      ))}
      {problems.length > SHOWN_PROBLEMS && (
        <Text color="fg.muted" textStyle="sm" mt="1">
          … and {(problems.length - SHOWN_PROBLEMS).toLocaleString('en-GB')} more rows.
        </Text>
      )}
    </Box>
  );
}
