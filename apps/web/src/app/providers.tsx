import { ChakraProvider } from '@chakra-ui/react';
import { QueryClientProvider } from '@tanstack/react-query';
import type { QueryClient } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { ToastPlace } from '../components/toast-place';
import { system } from './theme/system';

/** What every page stands in: look, data, messages. */
export function Providers({ client, children }: { client: QueryClient; children: ReactNode }) {
  return (
    <ChakraProvider value={system}>
      <QueryClientProvider client={client}>
        {children}
        <ToastPlace />
      </QueryClientProvider>
    </ChakraProvider>
  );
}
