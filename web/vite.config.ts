import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';
import { primerLayer } from './primer-layer.js';

// The API writes a fresh nonce over this word in every page it serves.
const NONCE = '__NONCE__';
const api = process.env.API_URL ?? 'http://127.0.0.1:4000';
const proxy = { '/graphql': api };

export default defineConfig({
  plugins: [react()],
  html: { cspNonce: NONCE },
  css: { postcss: { plugins: [primerLayer] } },
  server: { host: '127.0.0.1', proxy },
  preview: { host: '127.0.0.1', proxy },
  build: { target: 'es2023', sourcemap: true, manifest: false },
});
