import { Button, Text } from '@chakra-ui/react';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { ErrorState } from '../../components/error-state';
import { LoadingState } from '../../components/loading-state';
import { PageHeader } from '../../components/page-header';
import { postStop, stopQuery } from './calls';

/** Where a letter's stop link leads: nothing changes before the button is pressed, and it can be taken back. */
export function Stop() {
  const { token = '' } = useParams();
  const client = useQueryClient();
  const { data: view, error, refetch } = useQuery(stopQuery(token));
  const change = useMutation({
    mutationFn: (on: boolean) => postStop(token, on),
    onSuccess: (next) => client.setQueryData(stopQuery(token).queryKey, next),
  });
  if (error) return <ErrorState error={error} onRetry={() => void refetch()} />;
  if (!view) return <LoadingState rows={2} />;
  const { email, remindersOn, workshopName } = view;
  return (
    <>
      <PageHeader title={remindersOn ? 'Reminders by e-mail' : 'No more reminders'} lead={workshopName} />
      <Text mb="6" role="status">
        {remindersOn
          ? `We write to ${email} when a chain is due for wax or oil, or to be replaced.`
          : `We write no more reminders to ${email}. The chains can still be seen after signing in.`}
      </Text>
      {change.error && <ErrorState error={change.error} />}
      <Button
        variant={remindersOn ? 'solid' : 'outline'}
        loading={change.isPending}
        onClick={() => change.mutate(!remindersOn)}
      >
        {remindersOn ? 'Stop these reminders' : 'Write to me again'}
      </Button>
    </>
  );
}
