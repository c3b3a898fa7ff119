import { Box, chakra, Grid, Text } from '@chakra-ui/react';
import type { Chain } from '@halfpitch/contracts';
import { Link } from 'react-router-dom';
import { useFormat } from '../../app/use-format';
import { LinkStrip } from '../../components/drawings/link-strip';
import { regimeWords } from '../../components/trade-words';
import { dueWords } from '../chains/chain-words';
import { ElongationLine } from './elongation-line';
import { dueSoon } from './soonest';

const Tile = chakra(Link, {
  base: {
    display: 'block',
    p: { base: 4, md: 5 },
    bg: 'bg.panel',
    borderWidth: '1px',
    borderRadius: 'l3',
    _hover: { borderColor: 'border.control', bg: 'bg.muted' },
  },
});

/** A chain on the bench list: whose it is, how dry, when due, how far lengthened. */
export function BenchRow({ chain }: { chain: Chain }) {
  const format = useFormat();
  const { state } = chain;
  return (
    <li>
      <Tile to={`/bench/chains/${chain.id}`}>
        <Grid
          templateColumns={{ base: '1fr', md: 'minmax(0, 5fr) minmax(0, 6fr)', xl: '18rem 22rem 1fr' }}
          columnGap="6"
          rowGap="3"
          alignItems="center"
        >
          <Box>
            <Text textStyle="lg" fontWeight="semibold">
              {chain.riderName}
            </Text>
            <Text>{chain.bikeName ?? 'In the box'}</Text>
            <Text color="fg.muted">
              {chain.label} · {regimeWords[chain.regime].toLowerCase()}
            </Text>
          </Box>
          {state ? (
            <>
              <LinkStrip share={state.shareUsed} label={chain.label} />
              <Box gridColumn={{ md: '1 / -1', xl: 'auto' }}>
                {dueSoon(state).map(({ kind, window }) => (
                  <Text key={kind}>
                    <strong>{kind === 'replacement' ? 'Replace' : dueWords[chain.regime]}</strong>{' '}
                    {format.window(window)}
                  </Text>
                ))}
                <ElongationLine chain={chain} state={state} />
              </Box>
            </>
          ) : (
            <Text color="fg.muted">Being estimated; it takes a moment.</Text>
          )}
        </Grid>
      </Tile>
    </li>
  );
}
