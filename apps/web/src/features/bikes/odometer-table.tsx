import { IconButton } from '@chakra-ui/react';
import type { OdometerReading, Page } from '@halfpitch/contracts';
import { Trash2 } from 'lucide-react';
import { useFormat } from '../../app/use-format';
import { DataTable } from '../../components/data-table';
import { toastDone, toastError } from '../../components/toaster';
import { useChanged } from '../chains/follow-estimate';
import { addOdometer } from './api/add-odometer';
import { removeOdometer } from './api/remove-odometer';

interface OdometerTableProps {
  bikeId: string;
  chainId: string | null;
  found: Page<OdometerReading>;
  onPage: (page: number) => void;
}

export function OdometerTable({ bikeId, chainId, found, onPage }: OdometerTableProps) {
  const { day, distance } = useFormat();
  const changed = useChanged();
  const remove = async (reading: OdometerReading) => {
    try {
      await removeOdometer(bikeId, reading.id);
      changed(chainId);
      const putBack = () =>
        addOdometer(bikeId, { day: reading.day, odometerM: reading.odometerM }).then(() => changed(chainId));
      toastDone('The odometer reading is removed.', () => void putBack().catch(toastError));
    } catch (error) {
      toastError(error);
    }
  };
  if (found.total === 0) return null;
  return (
    <DataTable
      caption="Odometer readings"
      rows={found.items}
      rowKey={({ id }) => id}
      columns={[
        { head: 'Day', rowHead: true, cell: (row) => day(row.day) },
        { head: 'Odometer', numeric: true, cell: (row) => distance(row.odometerM) },
        {
          head: 'Change',
          numeric: true,
          cell: (row) => (
            <IconButton
              variant="ghost"
              aria-label={`Remove the reading of ${day(row.day)}`}
              onClick={() => void remove(row)}
            >
              <Trash2 size={18} aria-hidden="true" />
            </IconButton>
          ),
        },
      ]}
      paging={{ ...found, onPage }}
    />
  );
}
