import { fileURLToPath } from 'node:url';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

// Its build for Node has no element behind the announcements that Primer makes.
const liveRegion = new URL('../node_modules/@primer/live-region-element/dist/esm/index.js', import.meta.url);

export default defineConfig({
  plugins: [react()],
  resolve: { alias: { '@primer/live-region-element': fileURLToPath(liveRegion) } },
  test: {
    environment: 'jsdom',
    include: ['src/**/*.test.{ts,tsx}'],
    setupFiles: ['./src/test/setup.ts'],
    testTimeout: 30_000,
    css: false,
    // @primer/react imports its CSS, which Node cannot load by itself.
    server: { deps: { inline: [/@primer\/react/] } },
  },
});
