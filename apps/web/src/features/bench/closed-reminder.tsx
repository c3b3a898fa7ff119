import { Text } from '@chakra-ui/react';
import { roleMay } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { useFormat } from '../../app/use-format';
import { useSession } from '../../app/session';
import { remindersOfChainQuery } from './api/reminders-of-chain';

/** What became of the letter about the treatment that is now done; not everyone may read the letters. */
export function ClosedReminder({ chainId }: { chainId: string }) {
  const format = useFormat();
  const { role } = useSession();
  const mayRead = roleMay(role, 'reminders.read');
  const { data } = useQuery({ ...remindersOfChainQuery(chainId), enabled: mayRead });
  if (!mayRead)
    return <Text>A reminder that was open for it is closed: the rider gets no more letters about it.</Text>;
  const closed = data?.items.find(({ state, kind }) => state === 'closed' && kind === 'lubrication');
  if (!closed) return null;
  const when = closed.sentAt ? `sent ${format.instant(closed.sentAt)}` : 'never sent';
  return (
    <Text>
      The reminder to {closed.riderName} ({when}) is closed.
    </Text>
  );
}
