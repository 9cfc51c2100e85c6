import type { RecordDocument } from '../../../shared/api/recordDocument';
import { Moment } from '../../components/Moment';
import { useWords } from '../../components/words';

/** Who signed and what they meant by it. */
export function SignaturesList({ signatures }: { signatures: RecordDocument['signatures'] }) {
  const { t } = useWords();
  return (
    <ul className="m-0 list-none p-0">
      {signatures.map((signature) => (
        <li key={`${signature.kind} ${signature.name} ${signature.at}`} className="border-b border-rule py-2">
          <strong>{signature.name}</strong>, {t(`records.kind.${signature.kind}`)}
          <span className="block">“{signature.meaning}”</span>
          <span className="block text-sm">
            <Moment at={signature.at} form="exact" /> ({signature.zone})
          </span>
          <code className="block font-mono text-sm break-all text-muted">{signature.digest}</code>
        </li>
      ))}
    </ul>
  );
}
