/** What script a field route loads, gzipped: entry, its bundle, all they import, and the sentences of one language. */
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import { z } from 'zod';
import { buildClient } from '../../server/commands/clientBuild';
import { clientFolder } from '../../server/http/client';

// The aim for the first field screen.
const aimKB = 190;
const manifest = z.record(
  z.string(),
  z.object({ file: z.string(), imports: z.array(z.string()).default([]) }),
);

/** What runs on every field screen, by source: sending and looking for updates come after the first is drawn. */
const firstScreen = [
  'index.html',
  'src/app/fieldBranch.tsx',
  'shared/wording/en/phone.ts',
  'src/app/startDevice.ts',
];
const stepScreen = [...firstScreen, 'src/features/fieldwork/step/StepPage.tsx'];

function filesFrom(roots: string[], chunks: z.infer<typeof manifest>): string[] {
  const seen = new Set<string>();
  const visit = (name: string) => {
    if (seen.has(name)) return;
    seen.add(name);
    const chunk = chunks[name];
    if (!chunk) throw new Error(`the build has no chunk of ${name}`);
    chunk.imports.forEach(visit);
  };
  roots.forEach(visit);
  return [...seen].map((name) => chunks[name]?.file ?? '').filter((file) => file.endsWith('.js'));
}

/** In kB of 1000 bytes. */
function gzippedKB(files: string[]): number {
  const bytes = files.map((file) => gzipSync(readFileSync(join(clientFolder, file))).length);
  return bytes.reduce((sum, each) => sum + each, 0) / 1000;
}

/** Two lines for the bench's report; builds the client when its sources changed. */
export function fieldScriptSize(): string {
  buildClient();
  const chunks = manifest.parse(JSON.parse(readFileSync(join(clientFolder, '.vite/manifest.json'), 'utf8')));
  const first = gzippedKB(filesFrom(firstScreen, chunks));
  const step = gzippedKB(filesFrom(stepScreen, chunks));
  return [
    `script of the first field screen: ${first.toFixed(1)} kB gzipped, ${(first / aimKB).toFixed(2)} × the aim of ${aimKB} kB`,
    `script up to a step: ${step.toFixed(1)} kB gzipped, ${(step / aimKB).toFixed(2)} × the aim`,
  ].join('\n');
}
