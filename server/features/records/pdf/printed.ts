/** What a record's PDF is made of. */
import type { RecordDocument } from '../../../../shared/api/recordDocument';
import type { Panel } from '../../../../shared/panel/panelSchema';
import type { RecordWords } from './recordWords';
import type { Sheet } from './sheet';

export interface RecordToPrint {
  document: RecordDocument;
  number: number;
  digest: string;
  previousSeal: string | null;
  seal: string;
  sealedAt: Date;
  /** The panel revision that was worked on, for the loops of points with exceptions. */
  panel: Panel;
  /** Where the digest can be verified. */
  verifyUrl: string;
}

export interface Printing extends RecordToPrint {
  sheet: Sheet;
  words: RecordWords;
}
