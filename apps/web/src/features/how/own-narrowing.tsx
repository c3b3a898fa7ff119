import { Link, Stack, Text } from '@chakra-ui/react';
import { useQueries, useQuery } from '@tanstack/react-query';
import { Link as RouterLink } from 'react-router-dom';
import { percent } from '../../app/format';
import { Panel } from '../../components/panel';
import { methodWords } from '../../components/trade-words';
import { allChainsQuery } from '../chains/api/chains';
import { estimateQuery } from '../chains/api/estimate';

/** For a rider: which of their own chains' windows a reading would narrow, and to what. */
export function OwnNarrowing() {
  const chains = useQuery(allChainsQuery({ retired: 'no' })).data?.items ?? [];
  const estimates = useQueries({ queries: chains.map(({ id }) => estimateQuery(id)) });
  const rows = chains.flatMap((chain, i) => {
    const narrows = estimates[i]?.data?.narrows;
    return narrows ? [{ chain, narrows }] : [];
  });
  if (rows.length === 0) return null;
  return (
    <Panel title="For your own chains">
      <Stack gap="2">
        {rows.map(({ chain, narrows }) => (
          <Text key={chain.id}>
            <Link asChild fontWeight="semibold">
              <RouterLink to={`/chains/${chain.id}`}>{chain.label}</RouterLink>
            </Link>
            : a reading with a {methodWords[narrows.method].toLowerCase()} now would bring its replacement
            window to about {percent(narrows.factor)} of its width.
          </Text>
        ))}
      </Stack>
    </Panel>
  );
}
