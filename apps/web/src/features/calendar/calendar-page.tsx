import { Button, Flex, Stack, Text } from '@chakra-ui/react';
import type { CalendarFeed } from '@halfpitch/contracts';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useFormat } from '../../app/use-format';
import { ConfirmButton } from '../../components/confirm-button';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { Panel } from '../../components/panel';
import { toastDone, toastError } from '../../components/toaster';
import { calendarQuery, makeCalendar, stopCalendar } from './api/calendar';
import { NewAddress } from './new-address';

function Feed({ feed }: { feed: CalendarFeed }) {
  const client = useQueryClient();
  const { instant } = useFormat();
  const [address, setAddress] = useState<string>();
  const again = () => client.invalidateQueries({ queryKey: calendarQuery.queryKey });
  const make = async () => {
    setAddress((await makeCalendar()).address);
    await again();
  };
  const stop = async () => {
    await stopCalendar();
    setAddress(undefined);
    await again();
    toastDone('The address no longer works.');
  };
  if (feed.madeAt === null)
    return (
      <Stack gap="4" align="flex-start">
        <Text>No address is given out.</Text>
        <Button onClick={() => void make().catch(toastError)}>Make an address</Button>
      </Stack>
    );
  return (
    <Stack gap="4" align="flex-start">
      {address ? (
        <NewAddress address={address} />
      ) : (
        <Text>
          An address was made on {instant(feed.madeAt)}. It is not shown again; make a new one if you lost it.
        </Text>
      )}
      <Flex gap="3" wrap="wrap">
        <ConfirmButton
          variant="outline"
          question="Make a new address?"
          consequence="The one before stops working: calendars that use it are told that it is gone."
          confirmLabel="Make a new one"
          onConfirm={make}
        >
          New address
        </ConfirmButton>
        <ConfirmButton
          variant="outline"
          question="Stop the address?"
          consequence="Calendars that use it are told that it is gone. You can make another at any time."
          confirmLabel="Stop it"
          onConfirm={stop}
        >
          Stop
        </ConfirmButton>
      </Flex>
    </Stack>
  );
}

/** A rider's due windows in their own calendar, by a secret address. */
export function CalendarPage() {
  const query = useQuery(calendarQuery);
  return (
    <>
      <PageHeader
        title="In your calendar"
        lead="When each chain is due, and what you plan to ride, kept up to date in any calendar that subscribes to an address."
      />
      <Panel title="Your address" maxWidth="45rem">
        <Loaded query={query} rows={1} height="6rem">
          {(feed) => <Feed feed={feed} />}
        </Loaded>
      </Panel>
    </>
  );
}
