import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

/** `vite build` makes the page in dist; `vite build --mode cli` the command line in dist/cli. */
export default defineConfig(({ mode }) => ({
  base: './',
  plugins: [react()],
  build:
    mode === 'cli'
      ? {
          ssr: 'src/cli/poleward.ts',
          outDir: 'dist/cli',
          target: 'node20',
          copyPublicDir: false,
        }
      : { target: 'es2022', assetsInlineLimit: 0 },
  ...(mode === 'cli' ? { ssr: { noExternal: true as const } } : {}),
  worker: { format: 'es' as const },
  test: {
    include: ['tests/{unit,reference,property}/**/*.test.ts'],
    environment: 'node',
  },
}));
