import { Button, Stack, Text } from '@chakra-ui/react';
import type { Chain, ChainEstimate } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { Pencil, PenLine, Ruler } from 'lucide-react';
import { Link, useParams } from 'react-router-dom';
import { useSession } from '../../app/session';
import { useFormat } from '../../app/use-format';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { Panel } from '../../components/panel';
import { regimeWords } from '../../components/trade-words';
import { estimateQuery } from './api/estimate';
import { chainQuery } from './api/chain';
import { ChainAlerts } from './chain-alerts';
import { ChainHistory } from './chain-history';
import { speedWords } from './chain-words';
import { ElongationChart } from './elongation-chart';
import { LubricationPanel } from './lubrication-panel';
import { RotationPanel } from './rotation-panel';
import { UsageChart } from './usage-chart';
import { WearPanel } from './wear-panel';

function Answers({ chain, estimate }: { chain: Chain; estimate: ChainEstimate }) {
  const { instant } = useFormat();
  return (
    <Stack gap="6">
      <ChainAlerts alerts={estimate.alerts} regime={chain.regime} />
      <LubricationPanel chain={chain} estimate={estimate} />
      <WearPanel chain={chain} estimate={estimate} />
      <Panel>
        <ElongationChart chain={chain} estimate={estimate} />
      </Panel>
      <Panel>
        <UsageChart chain={chain} estimate={estimate} />
      </Panel>
      <RotationPanel chain={chain} />
      <ChainHistory chainId={chain.id} doubted={estimate.elongation.doubted} />
      <Text color="fg.muted" textStyle="sm">
        Estimated {instant(estimate.madeAt)}. An estimate does not replace a look at the chain: follow the
        maker’s manual.
      </Text>
    </Stack>
  );
}

function Actions({ chain }: { chain: Chain }) {
  return (
    <>
      <Button asChild>
        <Link to="reading">
          <Ruler size={20} aria-hidden="true" /> Enter a reading
        </Link>
      </Button>
      {chain.bikeId && (
        <Button asChild variant="outline">
          <Link to={`/log?bike=${chain.bikeId}`}>
            <PenLine size={20} aria-hidden="true" /> Log a ride
          </Link>
        </Button>
      )}
      <Button asChild variant="outline">
        <Link to="edit">
          <Pencil size={20} aria-hidden="true" /> Edit
        </Link>
      </Button>
    </>
  );
}

function ChainView({ chain }: { chain: Chain }) {
  const { riderId } = useSession();
  const estimate = useQuery(estimateQuery(chain.id));
  const facts = [
    riderId === null && chain.riderName,
    chain.retiredOn ? 'retired' : (chain.bikeName ?? 'in the box'),
    speedWords(chain.speeds),
    regimeWords[chain.regime].toLowerCase(),
  ];
  return (
    <>
      <PageHeader
        title={chain.label}
        lead={facts.filter(Boolean).join(' · ')}
        actions={<Actions chain={chain} />}
      />
      <Loaded query={estimate} rows={3} height="18rem">
        {(found) => <Answers chain={chain} estimate={found} />}
      </Loaded>
    </>
  );
}

/** One chain: when it is due, how sure that is, why, and what moved it. */
export function ChainPage() {
  const { id = '' } = useParams();
  const chain = useQuery(chainQuery(id));
  return <Loaded query={chain}>{(found) => <ChainView chain={found} />}</Loaded>;
}
