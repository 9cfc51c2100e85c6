import type { ReactNode } from 'react';
import type { FindingView } from '../../../shared/api/panels';
import { useWords } from '../words';
import { HarmMark } from './HarmMark';
import { SumTable } from './SumTable';
import { WhereTags } from './WhereTags';

function Remedy({ remedy }: { remedy: NonNullable<FindingView['remedy']> }) {
  const { t } = useWords();
  return (
    <p className="mt-2 mb-0 max-w-[66ch]">
      <strong>{t('office.remedy')}</strong> {remedy.says}
    </p>
  );
}

interface FindingItemProps {
  finding: FindingView;
  /** What may be done about it here: an acceptance, a field for its reason. */
  children?: ReactNode;
}

/** One finding: what it does, where, what it says, the sum, what mends it. */
export function FindingItem({ finding, children }: FindingItemProps) {
  return (
    <li className="border-b border-rule py-3">
      <div className="flex flex-wrap items-center gap-x-3 gap-y-1">
        <HarmMark harm={finding.harm} />
        <WhereTags where={finding.where} />
        <code className="font-mono text-sm text-muted">{finding.rule}</code>
      </div>
      <p className="mt-1 mb-0 max-w-[66ch]">{finding.says}</p>
      <SumTable because={finding.because} />
      {finding.remedy && <Remedy remedy={finding.remedy} />}
      {children}
    </li>
  );
}
