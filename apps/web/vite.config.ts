import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig, loadEnv } from 'vite';

export default defineConfig(({ mode }) => {
  const { PORT = '3000' } = loadEnv(mode, '.', ['PORT']);
  return {
    root: import.meta.dirname,
    plugins: [react(), tailwindcss()],
    build: {
      target: 'es2022',
      // A data: address would need a wider content security policy.
      assetsInlineLimit: 0,
      modulePreload: { polyfill: false },
      rolldownOptions: {
        output: {
          codeSplitting: {
            groups: [
              // One chunk, so that zod is told to do without eval before the first schema is made.
              {
                name: 'contract',
                test: /node_modules\/zod\/|packages\/contract\/|lib\/zod-without-eval/,
              },
            ],
          },
        },
      },
    },
    server: {
      host: '127.0.0.1',
      proxy: { '/api': `http://127.0.0.1:${PORT}` },
    },
  };
});
