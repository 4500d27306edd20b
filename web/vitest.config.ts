import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

export default defineConfig({
  plugins: [react()],
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
