import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';

/** `vite build` makes the client, `vite build --mode server` the server and its workers. */
export default defineConfig(({ mode }) =>
  mode === 'server'
    ? {
        publicDir: false,
        build: {
          ssr: true,
          target: 'node20',
          outDir: 'dist/server',
          emptyOutDir: true,
          rolldownOptions: {
            input: {
              main: 'server/main.ts',
              migrate: 'server/migrate.ts',
              createAdministrator: 'server/createAdministrator.ts',
              analysisWorker: 'server/workers/analysisWorker.ts',
              passwordWorker: 'server/workers/passwordWorker.ts',
            },
            // One flat folder: a worker stands beside whatever chunk starts it.
            output: { entryFileNames: '[name].js', chunkFileNames: '[name]-[hash].js' },
          },
        },
      }
    : {
        plugins: [react(), tailwindcss()],
        build: { outDir: 'dist/client', emptyOutDir: true, chunkSizeWarningLimit: 5000 },
      },
);
