import { Button, Flex, Text } from '@chakra-ui/react';

interface PagingProps {
  page: number;
  size: number;
  total: number;
  onPage: (page: number) => void;
}

const figures = new Intl.NumberFormat('en-GB');

/** Which part of a list is shown, and the way to the rest of it. */
export function Paging({ page, size, total, onPage }: PagingProps) {
  const last = Math.max(1, Math.ceil(total / size));
  const from = total === 0 ? 0 : (page - 1) * size + 1;
  const to = Math.min(total, page * size);
  return (
    <Flex as="nav" aria-label="Pages" gap="3" mt="4" wrap="wrap" align="center" justify="space-between">
      <Text color="fg.muted" fontVariantNumeric="tabular-nums" role="status">
        {figures.format(from)}–{figures.format(to)} of {figures.format(total)}
      </Text>
      {last > 1 && (
        <Flex gap="2">
          <Button variant="outline" disabled={page <= 1} onClick={() => onPage(page - 1)}>
            Back
          </Button>
          <Button variant="outline" disabled={page >= last} onClick={() => onPage(page + 1)}>
            Next
          </Button>
        </Flex>
      )}
    </Flex>
  );
}
