/** Builds the client into dist/client: hashed chunks, the app's manifest and its service worker. */
import { existsSync, readdirSync, rmSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig, type Plugin } from 'vite';
import { VitePWA } from 'vite-plugin-pwa';
import packageFile from './package.json' with { type: 'json' };

const outDir = 'dist/client';
// sync.md: old hashed files stay on the server for 30 days, for pages that still run them.
const keptMs = 30 * 24 * 3_600_000;

function dropOldAssets(folder: string, now: number): void {
  if (!existsSync(folder)) return;
  for (const name of readdirSync(folder)) {
    const path = join(folder, name);
    if (now - statSync(path).mtimeMs > keptMs) rmSync(path);
  }
}

/** The files of this build, so that older ones kept beside them are not precached. */
const built = new Set<string>();

const noteBuilt: Plugin = {
  name: 'note-built',
  buildStart: () => dropOldAssets(`${outDir}/assets`, Date.now()),
  generateBundle(_options, bundle) {
    for (const file of Object.keys(bundle)) built.add(file);
    const stamp = { version: packageFile.version, builtAt: new Date().toISOString() };
    this.emitFile({ type: 'asset', fileName: 'version.json', source: JSON.stringify(stamp) });
  },
};

const jsonSchemaFile = /zod\/v4\/core\/(to-json-schema|json-schema-processors)\.js$/;

/** Zod's writers of JSON Schema: no page writes any, and a phone would load them before its first screen. */
const withoutJsonSchema: Plugin = {
  name: 'without-json-schema',
  transform(code, id) {
    if (!jsonSchemaFile.test(id)) return null;
    const declared = code.matchAll(/^export (?:const|function) (\w+)/gm);
    const named = code.matchAll(/^export \{ (\w+ as \w+) \};/gm);
    const names = [...declared].map(([, name]) => `left as ${name}`);
    const renamed = [...named].map(([, pair]) => `left as ${pair?.split(' as ')[1]}`);
    const left = "const left = () => { throw new Error('JSON Schema is left out of the client'); };";
    return { code: `${left}\nexport { ${[...names, ...renamed].join(', ')} };`, map: null };
  },
};

// The package names only its development build, whose warnings no electrician reads.
const routerBuild = fileURLToPath(new URL('./node_modules/react-router/dist/production/', import.meta.url));

export default defineConfig(({ command }) => ({
  plugins: [
    react(),
    withoutJsonSchema,
    tailwindcss(),
    noteBuilt,
    VitePWA({
      strategies: 'injectManifest',
      srcDir: 'src/offline/serviceWorker',
      filename: 'sw.ts',
      outDir,
      registerType: 'prompt',
      injectRegister: false,
      injectManifest: {
        globPatterns: ['**/*.{js,css,html,svg,png,ico,woff2,webmanifest}'],
        // Only this build is precached, not what earlier ones left.
        manifestTransforms: [
          (manifest) => ({
            manifest: manifest.filter(({ url }) => !url.startsWith('assets/') || built.has(url)),
            warnings: [],
          }),
        ],
      },
      manifest: {
        id: '/',
        name: 'Coldloop',
        short_name: 'Coldloop',
        description: 'Lock-out and wiring checklists for the inputs and outputs of control panels.',
        start_url: '/my/jobs',
        scope: '/',
        display: 'standalone',
        background_color: '#f7f5f0',
        theme_color: '#14202b',
        icons: [
          { src: '/icon.svg', sizes: 'any', type: 'image/svg+xml' },
          { src: '/icon-192.png', sizes: '192x192', type: 'image/png' },
          { src: '/icon-512.png', sizes: '512x512', type: 'image/png' },
          { src: '/icon-maskable-512.png', sizes: '512x512', type: 'image/png', purpose: 'maskable' },
        ],
      },
    }),
  ],
  resolve: {
    alias:
      command === 'build'
        ? [
            { find: /^react-router$/, replacement: `${routerBuild}index.mjs` },
            { find: /^react-router\/dom$/, replacement: `${routerBuild}dom-export.mjs` },
          ]
        : [],
  },
  // `npm run dev` says where the server listens.
  server: process.env.COLDLOOP_API
    ? { proxy: { '/api': process.env.COLDLOOP_API, '/dev': process.env.COLDLOOP_API } }
    : {},
  // Nothing inlined: the page's policy takes fonts and pictures from this server only.
  build: { outDir, emptyOutDir: false, manifest: true, target: 'es2022', assetsInlineLimit: 0 },
}));
