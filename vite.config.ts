import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const api = `http://127.0.0.1:${process.env['COLDBENCH_API_PORT'] ?? '4311'}`;

const project = (name: string, pattern: string, more: object = {}) => ({
  test: { name, include: [`tests/**/*.${pattern}`], environment: 'node', ...more },
});

export default defineConfig({
  plugins: [react(), tailwindcss()],
  server: { host: '127.0.0.1', port: 4310, strictPort: true, proxy: { '/api': api } },
  build: { outDir: 'dist/client', emptyOutDir: true, sourcemap: true },
  worker: { format: 'es' },
  ssr: { external: true },
  test: {
    // Vitest leaves one core to its watcher; here each waits for a test.
    maxWorkers: '100%',
    projects: [
      project('unit', 'unit.test.ts', { testTimeout: 60_000 }),
      {
        plugins: [react()],
        ...project('client', 'client.test.tsx', {
          environment: 'jsdom',
          testTimeout: 30_000,
          setupFiles: ['tests/support/client-setup.ts'],
        }),
      },
      project('db', 'db.test.ts', {
        fileParallelism: false,
        testTimeout: 30_000,
        hookTimeout: 60_000,
      }),
      project('e2e', 'e2e.test.ts', {
        fileParallelism: false,
        testTimeout: 120_000,
        hookTimeout: 120_000,
      }),
    ],
  },
});
