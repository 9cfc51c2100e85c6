import type { Language } from '../../../../shared/api/common';
import type { BodyOf } from '../../../../shared/job/entry';
import { signatureDigest } from '../../../../shared/job/signatureDigest';
import type { FieldJob } from '../job/useFieldJob';
import type { Picture } from './SignForm';
import { zone } from './zone';

/** What every signature states: who, when and where, in which language, what it means, and the digest of what was shown. */
export function signatureBody(
  { pack, state, me }: FieldJob,
  language: Language,
  meaning: string,
  picture: Picture,
): Omit<BodyOf<'signed'>, 'steps'> {
  const digest = signatureDigest({ pack, state, language });
  return { name: me.name, zone: zone(), meaning, digest, language, picture };
}
