import { ChakraProvider } from '@chakra-ui/react';
import { createSystem, defineConfig } from '@chakra-ui/react/styled-system';
import type { ReactNode } from 'react';
import { moreRecipeOverrides, moreSlotOverrides } from './more-overrides';
import { moreRecipes, moreSlotRecipes } from './more-parts';
import { baseConfigs } from './system';

const system = createSystem(
  ...baseConfigs,
  defineConfig({ theme: { recipes: moreRecipes, slotRecipes: moreSlotRecipes } }),
  defineConfig({ theme: { recipes: moreRecipeOverrides, slotRecipes: moreSlotOverrides } }),
);

/** Gives what stands in it the parts that the first page does without. */
export const MoreParts = ({ children }: { children: ReactNode }) => (
  <ChakraProvider value={system}>{children}</ChakraProvider>
);
