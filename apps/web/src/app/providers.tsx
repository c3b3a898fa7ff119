import { ChakraProvider } from '@chakra-ui/react';
import { QueryClientProvider } from '@tanstack/react-query';
import type { QueryClient } from '@tanstack/react-query';
import { LazyMotion, MotionConfig } from 'framer-motion';
import type { ReactNode } from 'react';
import { Toasts } from '../components/toasts';
import { system } from './theme/system';

const motion = () => import('./motion-features').then((module) => module.default);

/** What every page stands in: look, data, motion (which comes later and minds reduced motion), messages. */
export function Providers({ client, children }: { client: QueryClient; children: ReactNode }) {
  return (
    <ChakraProvider value={system}>
      <QueryClientProvider client={client}>
        <LazyMotion features={motion} strict>
          <MotionConfig reducedMotion="user">{children}</MotionConfig>
        </LazyMotion>
        <Toasts />
      </QueryClientProvider>
    </ChakraProvider>
  );
}
