import { Button, HStack, Text } from '@chakra-ui/react';
import type { Page } from '@halfpitch/contracts';
import { useUrlState } from './use-url-state';

/** Steps through a list's pages; nothing when there is only one. */
export function Pager({ page }: { page: Pick<Page<unknown>, 'total' | 'page' | 'size'> }) {
  const [, go] = useUrlState('page', '1');
  const pages = Math.ceil(page.total / page.size);
  if (pages <= 1) return null;
  const first = (page.page - 1) * page.size + 1;
  return (
    <HStack as="nav" aria-label="Pages" mt="5" gap="3" justify="space-between" wrap="wrap">
      <Button variant="outline" disabled={page.page <= 1} onClick={() => go(String(page.page - 1))}>
        Previous
      </Button>
      <Text color="fg.muted" fontVariantNumeric="tabular-nums">
        {first}–{Math.min(page.total, first + page.size - 1)} of {page.total}
      </Text>
      <Button variant="outline" disabled={page.page >= pages} onClick={() => go(String(page.page + 1))}>
        Next
      </Button>
    </HStack>
  );
}
