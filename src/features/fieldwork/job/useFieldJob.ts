import { createContext, useContext } from 'react';
import type { Pack, PackPerson } from '../../../../shared/api/jobs';
import type { Step } from '../../../../shared/checklist/types';
import type { JobState } from '../../../../shared/job/types';
import type { Text } from '../../../../shared/panel/says';
import type { Here } from '../../../components/field/here';
import type { LocalJob } from '../../../offline/types';

export interface FieldJob {
  local: LocalJob;
  pack: Pack;
  state: JobState;
  me: Here;
  part: PackPerson['part'] | undefined;
  /** A text of the pack in the language of the screen, its tags marked for boxes. */
  marked: (text: Text) => string;
  /** The same without marks. */
  plain: (text: Text) => string;
  nameOf: (person: string) => string;
  stepOf: (id: string) => Step | undefined;
}

export const FieldJobContext = createContext<FieldJob | null>(null);

export function useFieldJob(): FieldJob {
  const job = useContext(FieldJobContext);
  if (!job) throw new Error('useFieldJob outside JobLayout');
  return job;
}
