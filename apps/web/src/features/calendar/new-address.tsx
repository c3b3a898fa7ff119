import { Button, Code, Stack, Text } from '@chakra-ui/react';
import { Copy } from 'lucide-react';
import { toastDone, toastError } from '../../components/toaster';

/** The one time the address is seen, with a way to copy it. */
export function NewAddress({ address }: { address: string }) {
  const copy = () =>
    navigator.clipboard.writeText(address).then(() => toastDone('The address is copied.'), toastError);
  return (
    <Stack role="status" gap="3" align="flex-start">
      <Text>
        Copy it now and add it to your calendar as a subscription: it is not shown again. Whoever has it can
        see when your chains are due.
      </Text>
      <Code size="lg" p="3" overflowWrap="anywhere" whiteSpace="normal">
        {address}
      </Code>
      <Button onClick={() => void copy()}>
        <Copy size={20} aria-hidden="true" /> Copy the address
      </Button>
    </Stack>
  );
}
