import { Box, Flex, Stack, Text } from '@chakra-ui/react';
import type { StaffMember } from '@halfpitch/contracts';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useSession } from '../../app/session';
import { ConfirmButton } from '../../components/confirm-button';
import { Loaded } from '../../components/loaded';
import { Panel } from '../../components/panel';
import { toastDone } from '../../components/toaster';
import { roleWords } from '../../components/trade-words';
import { removeStaff, staffQuery } from './api/staff';
import { InviteStaff } from './invite-staff';

function Member({ member }: { member: StaffMember }) {
  const client = useQueryClient();
  const isSelf = useSession().account.email === member.email;
  const remove = async () => {
    await removeStaff(member.id);
    await client.invalidateQueries({ queryKey: staffQuery.queryKey });
    toastDone(`${member.name} can no longer sign in here.`);
  };
  return (
    <Flex as="li" justify="space-between" align="center" gap="3" py="3" borderTopWidth="1px">
      <Box minWidth="0">
        <Text fontWeight="semibold">{member.name}</Text>
        <Text color="fg.muted" textStyle="sm" overflowWrap="anywhere">
          {roleWords[member.role]}
          {!member.joined && ', invited'} · {member.email}
        </Text>
      </Box>
      {!isSelf && (
        <ConfirmButton
          size="sm"
          variant="outline"
          aria-label={`Remove ${member.name}`}
          question={`Remove ${member.name}?`}
          consequence="They are signed out and can’t sign in here again. What they recorded stays."
          confirmLabel="Remove"
          final
          onConfirm={remove}
        >
          Remove
        </ConfirmButton>
      )}
    </Flex>
  );
}

/** Who works here, with invitation and removal. */
export function StaffPanel() {
  const query = useQuery(staffQuery);
  return (
    <Panel title="Staff">
      <Loaded query={query} rows={3} height="3.5rem">
        {({ items }) => (
          <Stack as="ul" listStyleType="none" gap="0">
            {items.map((member) => (
              <Member key={member.id} member={member} />
            ))}
          </Stack>
        )}
      </Loaded>
      <InviteStaff />
    </Panel>
  );
}
