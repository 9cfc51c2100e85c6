/** A pack is taken only when it is what its digest says. */
import { z } from 'zod';
import type { Pack } from '../../shared/api/jobs';
import { digest } from '../../shared/api/common';
import { digestOf } from '../../shared/panel/canonical';

const packOutside = z.looseObject({
  format: z.string(),
  digest,
  job: z.looseObject({ id: z.uuid() }),
});

export type PackVerdict = { ok: true; pack: Pack } | { ok: false; why: 'not-a-pack' | 'newer' | 'digest' };

/** Whether the stored or received value is a whole pack of this version's format. */
export function packIntegrity(value: unknown): PackVerdict {
  const outside = packOutside.safeParse(value);
  if (!outside.success) return { ok: false, why: 'not-a-pack' };
  if (outside.data.format !== 'coldloop-pack/1') return { ok: false, why: 'newer' };
  const { digest: named, ...rest } = outside.data;
  if (digestOf(rest) !== named) return { ok: false, why: 'digest' };
  // The digest covers all of it and the server made it from these types.
  return { ok: true, pack: value as Pack };
}
