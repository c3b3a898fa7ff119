import react from '@vitejs/plugin-react';
import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const here = (path: string) => fileURLToPath(new URL(path, import.meta.url));

export default defineConfig({
  root: here('.'),
  plugins: [react()],
  resolve: {
    tsconfigPaths: true,
    // The same parser, made for where there is no Buffer.
    alias: [{ find: /^csv-parse\/sync$/, replacement: 'csv-parse/browser/esm/sync' }],
  },
  build: {
    outDir: here('../../dist/apps/web'),
    emptyOutDir: true,
    target: 'es2023',
    modulePreload: { polyfill: false },
    // Chakra's own theme is made by calls the bundler takes for needed: 25 kB of parts that nobody shows.
    rolldownOptions: {
      treeshake: {
        manualPureFunctions: ['defineConfig', 'defineSlotRecipe', 'defineRecipe'],
        // A page takes from a library what it names, not what the barrel lists.
        moduleSideEffects: [{ test: /libs[\\/](contracts|ride-files)[\\/]/, sideEffects: false }],
      },
    },
  },
  server: { proxy: { '/api': process.env.API_URL ?? 'http://127.0.0.1:4190' } },
  test: {
    environment: 'jsdom',
    include: ['src/**/*.spec.{ts,tsx}'],
    setupFiles: [here('src/test-setup.ts')],
    css: false,
  },
});
