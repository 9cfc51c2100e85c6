import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { desk } from '../../shared/wording/en/desk';
import { en } from '../../shared/wording/en';
import { phone } from '../../shared/wording/en/phone';
import { es } from '../../shared/wording/es';
import { desk as deskEs } from '../../shared/wording/es/desk';
import { phone as phoneEs } from '../../shared/wording/es/phone';

/** What a phone loads: its own screens and what they share with the desk, but not the desk's own parts. */
const folders = ['app', 'components', 'diagrams', 'offline', 'features/fieldwork', 'features/device'];
const desksOwn = 'src/components/findings';

const sources = folders
  .flatMap((folder) =>
    readdirSync(join('src', folder), { recursive: true, encoding: 'utf8' }).map((name) =>
      join('src', folder, name),
    ),
  )
  .filter((path) => /\.tsx?$/.test(path) && !path.startsWith(desksOwn));

/** The start of each literal key that a source says: up to a value put in, or whole. */
const said = (source: string): string[] =>
  [...source.matchAll(/\b(?:t|say)\(\s*['"`]([\w-]+\.[\w.-]*)/g)].map(([, key = '']) => key);

test('every sentence that a phone screen says is among the messages a phone carries', () => {
  const keys = Object.keys(phone);
  const missing = sources.flatMap((path) =>
    said(readFileSync(path, 'utf8'))
      .filter((start) => !keys.some((key) => key.startsWith(start)))
      .map((start) => `${path}: ${start}`),
  );
  expect(missing).toEqual([]);
  expect(sources.flatMap((path) => said(readFileSync(path, 'utf8'))).length).toBeGreaterThan(200);
});

test('no phone screen shows a part of the desk', () => {
  const showing = sources
    .filter((path) => path.includes('/fieldwork/') || path.includes('/device/') || path.includes('/offline/'))
    .filter((path) => readFileSync(path, 'utf8').includes('components/findings'));
  expect(showing).toEqual([]);
});

test.each([
  ['en', en, phone, desk],
  ['es', es, phoneEs, deskEs],
])('phone and desk together hold all of %s but mail and the command line', (_language, all, ...parts) => {
  const held = new Set(parts.flatMap((part) => Object.keys(part)));
  const left = Object.keys(all).filter((key) => !held.has(key));
  expect([...new Set(left.map((key) => key.split('.')[0]))].sort()).toEqual(['check', 'mail']);
});
