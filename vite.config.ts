/**
 * `vite build` makes the page, `vite build --mode cli` the command line as one file. `npm run build` puts the first into
 * dist and the second into dist/cli. The same sources give the same bytes and names.
 */

import { createHash } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import { resolve } from 'node:path';
import react from '@vitejs/plugin-react';
import type { Plugin } from 'vite';
import { defineConfig } from 'vitest/config';

/** What the page may do: run its own files, nothing inline, nothing from elsewhere (W3C, Content Security Policy Level 3). */
const SECURITY_POLICY = [
  "default-src 'none'",
  "script-src 'self'",
  "worker-src 'self'",
  "style-src 'self'",
  "img-src 'self' data: blob:",
  "font-src 'self'",
  "connect-src 'self'",
  "manifest-src 'self'",
  "base-uri 'none'",
  "form-action 'none'",
].join('; ');

/** Writes the policy into the built page, ahead of everything that it governs; the development server works without. */
function securityPolicy(): Plugin {
  return {
    name: 'security-policy',
    apply: 'build',
    transformIndexHtml: html =>
      html.replace(
        /<meta charset="[^"]+" \/>/,
        charset => `${charset}\n    <meta http-equiv="Content-Security-Policy" content="${SECURITY_POLICY}" />`,
      ),
  };
}

/**
 * Leaves out what d3 brings for transitions: the sheet glides by its own clock (glide-view.ts), so that pan and zoom set each
 * view at once and never start one. In d3-scale the reading of CSS colours goes too, of which plots have no use. 27 kB less to load.
 */
function noTransitions(): Plugin {
  const colours = ['rgb', 'hsl', 'lab', 'hcl', 'lch', 'gray', 'cubehelix'];
  const sources: Readonly<Record<string, string>> = {
    'd3-color': `export const color = () => null;\nexport const ${colours.map(n => `${n} = color`).join(', ')};`,
    'd3-interpolate': 'export const interpolateZoom = null;\nexport const interpolate = null;',
    'd3-transition': [
      "import { selection } from 'd3-selection';",
      'export const interrupt = () => {};',
      'selection.prototype.interrupt = function () { return this; };',
    ].join('\n'),
  };
  const isOfSheet = (importer: string | undefined) => /d3-zoom|@xyflow/.test(importer ?? '');
  return {
    name: 'no-transitions',
    apply: 'build',
    enforce: 'pre',
    resolveId: (source, importer) =>
      source === 'd3-color' || (source in sources && isOfSheet(importer)) ? `\0${source}` : null,
    load: id => (id.startsWith('\0d3-') ? { code: sources[id.slice(1)] ?? '', moduleSideEffects: true } : null),
  };
}

/**
 * The worker as a chunk of the page's own build, so that both share what both use and a visitor loads it once. A worker built
 * by itself would bring a second copy of the parser and the document.
 */
function sharedWorker(): Plugin {
  const name = 'virtual:derivation-worker';
  return {
    name: 'shared-worker',
    resolveId: source => (source === name ? `\0${name}` : null),
    load(id) {
      if (id !== `\0${name}`) return null;
      if (this.environment.mode === 'dev') return "export { default } from '/src/worker/worker.ts?worker&url';";
      const chunk = this.emitFile({ type: 'chunk', id: resolve('src/worker/worker.ts'), name: 'worker' });
      return `export default import.meta.ROLLUP_FILE_URL_${chunk};`;
    },
  };
}

/**
 * Makes the page work without a network after the first visit: a service worker (W3C, Service Workers) that holds every file of the build.
 * Its text is src/ui/offline/service-worker.js with the list of files and their fingerprint in front, so that it changes with them.
 */
function offline(): Plugin {
  return {
    name: 'offline',
    apply: 'build',
    enforce: 'post',
    generateBundle(_, bundle) {
      const shared = readdirSync('public').filter(name => name !== 'screenshot.png');
      const files = [...Object.keys(bundle).filter(name => name !== 'index.html'), ...shared].sort();
      const hash = createHash('sha256');
      for (const part of Object.values(bundle)) hash.update(part.type === 'asset' ? part.source : part.code);
      for (const name of shared) hash.update(readFileSync(resolve('public', name)));
      const source = [
        `const VERSION = '${hash.digest('hex').slice(0, 16)}';`,
        `const FILES = ${JSON.stringify(['./', ...files.map(name => `./${name}`)])};`,
        readFileSync('src/ui/offline/service-worker.js', 'utf8'),
      ].join('\n');
      this.emitFile({ type: 'asset', fileName: 'service-worker.js', source });
    },
  };
}

const page = {
  target: 'es2022',
  /** A font or an image inlined as a data address would be refused by the policy. */
  assetsInlineLimit: 0,
  /** No preloading of what is imported on demand: the worker does so too, and has no document to put links in. */
  modulePreload: false as const,
};

const commandLine = {
  ssr: 'src/cli/poleward.ts',
  target: 'node20',
  copyPublicDir: false,
  minify: true,
  rolldownOptions: { output: { codeSplitting: false, entryFileNames: '[name].js' } },
};

export default defineConfig(({ mode }) => ({
  base: './',
  plugins: [react(), securityPolicy(), sharedWorker(), noTransitions(), ...(mode === 'cli' ? [] : [offline()])],
  build: mode === 'cli' ? commandLine : page,
  ...(mode === 'cli' ? { ssr: { noExternal: true as const } } : {}),
  worker: { format: 'es' as const },
  test: {
    include: ['tests/{architecture,unit,reference,property}/**/*.test.ts'],
    environment: 'node',
    /** Some tests start processes of their own; two busy cores take their time. */
    testTimeout: 30_000,
  },
}));
