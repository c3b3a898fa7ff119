import { Button, Grid, Link, Stack } from '@chakra-ui/react';
import type { Chain, Treatment } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Link as RouterLink, useParams } from 'react-router-dom';
import { ErrorState } from '../../components/error-state';
import { LoadingState } from '../../components/loading-state';
import { Notice } from '../../components/notice';
import { PageHeader } from '../../components/page-header';
import { regimeWords } from '../../components/trade-words';
import { chainQuery } from '../chains/api/chain';
import { ChainNow } from './chain-now';
import { Recorded } from './recorded';
import { TreatmentSheet } from './treatment-sheet';

function Lead({ chain }: { chain: Chain }) {
  return (
    <>
      <Link asChild>
        <RouterLink to={`/riders/${chain.riderId}`}>{chain.riderName}</RouterLink>
      </Link>
      {' · '}
      {chain.bikeName ?? 'in the box'} · {chain.speeds} speeds · {regimeWords[chain.regime].toLowerCase()}
    </>
  );
}

/** A chain on the bench: how it stands, and one page to record what is done to it. */
export function BenchChain() {
  const { id = '' } = useParams();
  const { data: chain, error, refetch } = useQuery(chainQuery(id));
  const [recorded, setRecorded] = useState<{ treatment: Treatment; before: Chain['state'] } | null>(null);
  if (error && !chain) return <ErrorState error={error} onRetry={() => void refetch()} />;
  if (!chain) return <LoadingState rows={3} height="9rem" />;
  return (
    <>
      <PageHeader
        title={chain.label}
        lead={<Lead chain={chain} />}
        actions={
          <Button asChild variant="outline">
            <RouterLink to={`/chains/${chain.id}`}>The chain’s page</RouterLink>
          </Button>
        }
      />
      <Stack gap="8">
        {chain.retiredOn !== null ? (
          <Notice>
            This chain is out of service. Take it back into service on its page before you treat it.
          </Notice>
        ) : recorded ? (
          <Recorded {...recorded} onUndone={() => setRecorded(null)} onAnother={() => setRecorded(null)} />
        ) : (
          <Grid gap="8">
            <ChainNow chain={chain} />
            <TreatmentSheet
              chain={chain}
              onRecorded={(treatment) => setRecorded({ treatment, before: chain.state })}
            />
          </Grid>
        )}
      </Stack>
    </>
  );
}
