import { Box, Flex, Stack, Text } from '@chakra-ui/react';
import type { ApiToken } from '@halfpitch/contracts';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useFormat } from '../../app/use-format';
import { ConfirmButton } from '../../components/confirm-button';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { Panel } from '../../components/panel';
import { toastDone } from '../../components/toaster';
import { revokeToken, tokensQuery } from './api/tokens';
import { NewToken } from './new-token';
import { scopeWords } from './token-form';

function Token({ token }: { token: ApiToken }) {
  const client = useQueryClient();
  const { day, instant } = useFormat();
  const revoke = async () => {
    await revokeToken(token.id);
    await client.invalidateQueries({ queryKey: tokensQuery.queryKey });
    toastDone(`The token ${token.name} no longer works.`);
  };
  const used = token.lastUsedAt ? `last used ${instant(token.lastUsedAt)}` : 'never used';
  const end = token.lastDay && (token.expired ? 'expired' : `works until ${day(token.lastDay)}`);
  const does = token.scopes.map((scope) => scopeWords[scope]).join(', ');
  return (
    <Flex as="li" justify="space-between" align="center" gap="3" py="3" borderTopWidth="1px">
      <Box minWidth="0">
        <Text fontWeight="semibold" overflowWrap="anywhere">
          {token.name}
        </Text>
        <Text color="fg.muted" textStyle="sm">
          {[token.workshopName, does, used, end].filter(Boolean).join(' · ')}
        </Text>
      </Box>
      <ConfirmButton
        variant="outline"
        aria-label={`Revoke ${token.name}`}
        question={`Revoke ${token.name}?`}
        consequence="Scripts that use it are refused from now on. What they recorded stays."
        confirmLabel="Revoke it"
        final
        onConfirm={revoke}
      >
        Revoke
      </ConfirmButton>
    </Flex>
  );
}

/** A person's tokens for scripts: made, listed, revoked. */
export function Tokens() {
  return (
    <>
      <PageHeader title="Tokens for scripts" lead="So that a program of yours can read or log for you." />
      <Stack gap="6" maxWidth="45rem">
        <Panel title="Your tokens">
          <Loaded query={useQuery(tokensQuery)} rows={2} height="3.5rem">
            {({ items }) =>
              items.length === 0 ? (
                <Text color="fg.muted">You have none.</Text>
              ) : (
                <Stack as="ul" listStyleType="none" gap="0">
                  {items.map((token) => (
                    <Token key={token.id} token={token} />
                  ))}
                </Stack>
              )
            }
          </Loaded>
        </Panel>
        <NewToken />
      </Stack>
    </>
  );
}
