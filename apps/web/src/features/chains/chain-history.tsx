import { Tabs } from '@chakra-ui/react';
import type { SystemStyleObject } from '@chakra-ui/react';
import type { ChainEstimate } from '@halfpitch/contracts';
import { Panel } from '../../components/panel';
import { ReadingTable } from '../readings/reading-table';
import { RideList } from '../rides/ride-list';
import { TreatmentTable } from '../treatments/treatment-table';
import { BeliefTable } from './belief-table';
import { FittingTable } from './fitting-table';

interface ChainHistoryProps {
  chainId: string;
  /** Readings that do not fit the others, with the reason. */
  doubted: ChainEstimate['elongation']['doubted'];
}

const trigger: SystemStyleObject = {
  minHeight: '11',
  px: 2,
  justifyContent: 'center',
  borderBottomWidth: '3px',
  borderColor: 'transparent',
  _before: { display: 'none' },
  _selected: { color: 'steel.fg', fontWeight: 'semibold', borderColor: 'steel.solid' },
};

/** Everything that happened to the chain, and what was made of it. */
export function ChainHistory({ chainId, doubted }: ChainHistoryProps) {
  const parts = [
    { value: 'readings', label: 'Readings', view: <ReadingTable chainId={chainId} doubted={doubted} /> },
    { value: 'treatments', label: 'Treatments', view: <TreatmentTable chainId={chainId} /> },
    { value: 'rides', label: 'Rides', view: <RideList filter={{ chainId }} /> },
    { value: 'bikes', label: 'Bikes', view: <FittingTable chainId={chainId} /> },
    { value: 'estimates', label: 'Estimates', view: <BeliefTable chainId={chainId} /> },
  ];
  return (
    <Panel title="History">
      <Tabs.Root defaultValue="readings" lazyMount>
        <Tabs.List
          display="grid"
          gridTemplateColumns="repeat(auto-fit, minmax(5.75rem, 1fr))"
          borderBottomWidth="1px"
        >
          {parts.map(({ value, label }) => (
            <Tabs.Trigger key={value} value={value} css={trigger}>
              {label}
            </Tabs.Trigger>
          ))}
        </Tabs.List>
        {parts.map(({ value, view }) => (
          <Tabs.Content key={value} value={value}>
            {view}
          </Tabs.Content>
        ))}
      </Tabs.Root>
    </Panel>
  );
}
