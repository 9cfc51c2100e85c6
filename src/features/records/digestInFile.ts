import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex } from '@noble/hashes/utils.js';

export type FoundInFile =
  | { kind: 'record'; record: Record<string, unknown> }
  /** `file` is the SHA-256 of the PDF itself; `printed` the digest of the record it names, if one can be read. */
  | { kind: 'pdf'; file: string; printed: string | undefined }
  | { kind: 'nothing' };

// The record's digest stands in the PDF's document information, outside its compressed streams.
const fullDigest = /\b[0-9a-f]{64}\b/;

const isObject = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

function recordIn(text: string): FoundInFile {
  try {
    const json: unknown = JSON.parse(text);
    return isObject(json) ? { kind: 'record', record: json } : { kind: 'nothing' };
  } catch {
    return { kind: 'nothing' };
  }
}

/** What a dropped file lets the server verify: a whole record (JSON), or a PDF by its own hash and the digest it carries. */
export async function digestInFile(file: File): Promise<FoundInFile> {
  const bytes = new Uint8Array(await file.arrayBuffer());
  const start = new TextDecoder('latin1').decode(bytes.subarray(0, 5));
  if (start !== '%PDF-') return recordIn(new TextDecoder().decode(bytes));
  const printed = fullDigest.exec(new TextDecoder('latin1').decode(bytes))?.[0];
  return { kind: 'pdf', file: bytesToHex(sha256(bytes)), printed };
}
