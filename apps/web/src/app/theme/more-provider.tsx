import { ChakraProvider } from '@chakra-ui/react';
import { createSystem, defineConfig } from '@chakra-ui/react/styled-system';
import type { ReactNode } from 'react';
import { moreOverrides } from './more-overrides';
import { moreRecipes, moreSlotRecipes } from './more-parts';
import { baseConfigs } from './system';

const system = createSystem(
  ...baseConfigs,
  defineConfig({ theme: { recipes: moreRecipes, slotRecipes: moreSlotRecipes } }),
  defineConfig({ theme: { slotRecipes: moreOverrides } }),
);

/** Gives what stands in it the parts that the first page does without. */
export const MoreParts = ({ children }: { children: ReactNode }) => (
  <ChakraProvider value={system}>{children}</ChakraProvider>
);
