import { ChakraProvider } from '@chakra-ui/react';
import { QueryClientProvider } from '@tanstack/react-query';
import type { QueryClient } from '@tanstack/react-query';
import { lazy, Suspense } from 'react';
import type { ReactNode } from 'react';
import { system } from './theme/system';

const Toasts = lazy(async () => ({ default: (await import('../components/toasts')).Toasts }));

/** What every page stands in: look, data, and the place where messages come up. */
export function Providers({ client, children }: { client: QueryClient; children: ReactNode }) {
  return (
    <ChakraProvider value={system}>
      <QueryClientProvider client={client}>
        {children}
        <Suspense>
          <Toasts />
        </Suspense>
      </QueryClientProvider>
    </ChakraProvider>
  );
}
