import type { Language } from '../../../../shared/api/common';
import type { BodyOf } from '../../../../shared/job/entry';
import { digestToSign } from '../job/engine';
import type { FieldJob } from '../job/useFieldJob';
import type { Picture } from './SignForm';
import { zone } from './zone';

/** What every signature states: who, when and where, in which language, what it means, and the digest of what was shown. */
export function signatureBody(
  { local, me }: FieldJob,
  language: Language,
  meaning: string,
  picture: Picture,
): Omit<BodyOf<'signed'>, 'steps'> {
  const digest = digestToSign(local, language);
  return { name: me.name, zone: zone(), meaning, digest, language, picture };
}
