import { es as spanish } from 'zod/locales';
import type { Language } from '../../../shared/api/common';
import { maxPanelBytes, panelSchema, type Panel } from '../../../shared/panel/panelSchema';

export type ReadPanel =
  | { ok: true; panel: Panel }
  | { ok: false; code: 'too-big' | 'not-json' | 'not-a-panel'; errors: { path: string; says: string }[] };

const refused = (
  code: 'too-big' | 'not-json' | 'not-a-panel',
  errors: { path: string; says: string }[] = [],
) => ({ ok: false, code, errors }) as const;

function parseJson(text: string): unknown {
  try {
    return JSON.parse(text) as unknown;
  } catch {
    return undefined;
  }
}

/**
 * Reads a panel file: a size no panel may have is refused before a byte is read; then every place that does
 * not fit the schema is listed with its path. Nothing of a refused file is kept.
 */
export async function readPanelFile(file: File, language: Language): Promise<ReadPanel> {
  if (file.size > maxPanelBytes) return refused('too-big');
  const json = parseJson(await file.text());
  if (json === undefined) return refused('not-json');
  const parsed = panelSchema.safeParse(
    json,
    language === 'es' ? { error: spanish().localeError } : undefined,
  );
  if (parsed.success) return { ok: true, panel: parsed.data };
  return refused(
    'not-a-panel',
    parsed.error.issues.map((issue) => ({ path: issue.path.map(String).join('.'), says: issue.message })),
  );
}
