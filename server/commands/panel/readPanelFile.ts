/** A panel file on disk, or every reason why it cannot be read as one. */
import { readFile, stat } from 'node:fs/promises';
import { maxPanelBytes, panelSchema, type Panel } from '../../../shared/panel/panelSchema';
import { schemaErrors } from '../../../shared/panel/schemaErrors';

/** Thrown with what stands on standard error, one `path: says` a line. */
export class Unreadable extends Error {
  constructor(readonly reasons: { path: string; says: string }[]) {
    super(reasons.map(({ path, says }) => `${path}: ${says}`).join('\n'));
  }
}

const reasonOf = (error: unknown): string => (error instanceof Error ? error.message : String(error));

async function bytesOf(file: string): Promise<Buffer> {
  try {
    // Looked at before it is read: a file of any size must not fill the memory first.
    if ((await stat(file)).size > maxPanelBytes)
      throw new Error(`holds more than ${maxPanelBytes / 1024 / 1024} MB`);
    return await readFile(file);
  } catch (error) {
    throw new Unreadable([{ path: file, says: reasonOf(error) }]);
  }
}

function documentOf(file: string, bytes: Buffer): unknown {
  try {
    const json: unknown = JSON.parse(new TextDecoder('utf-8', { fatal: true }).decode(bytes));
    return json;
  } catch (error) {
    const says = error instanceof SyntaxError ? `is not JSON: ${error.message}` : 'is not UTF-8 text';
    throw new Unreadable([{ path: file, says }]);
  }
}

/** @throws Unreadable when the file is missing, too large, not JSON, or no panel. */
export async function readPanelFile(file: string): Promise<Panel> {
  const parsed = panelSchema.safeParse(documentOf(file, await bytesOf(file)));
  if (parsed.success) return parsed.data;
  // An empty path is the document itself: the file's name stands for it.
  throw new Unreadable(schemaErrors(parsed.error).map(({ path, says }) => ({ path: path || file, says })));
}
