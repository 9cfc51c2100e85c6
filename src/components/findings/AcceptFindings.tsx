import type { FindingView } from '../../../shared/api/panels';
import { WordsField } from '../form/WordsField';
import { useWords } from '../words';
import { acceptanceGroups, acceptanceKey, type Reasons } from './acceptances';
import { FindingItem } from './FindingItem';
import { oneLine } from '../field/oneLine';

interface AcceptFindingsProps {
  findings: readonly (FindingView & { place: string })[];
  reasons: Reasons;
  onReason: (key: string, reason: string) => void;
  /** True once the person tried to go on: then a missing reason is said at its field. */
  tried: boolean;
}

/** Findings that stand unless somebody accepts them, by name, with a reason. */
export function AcceptFindings({ findings, reasons, onReason, tried }: AcceptFindingsProps) {
  const { t } = useWords();
  return (
    <ul className="m-0 list-none p-0">
      {acceptanceGroups(findings).map(({ first, count }) => {
        const key = acceptanceKey(first);
        return (
          <FindingItem key={key} finding={first}>
            {count > 1 && <p className="mb-0">{t('office.accept.group', { n: count })}</p>}
            <WordsField
              label={t('office.accept.reason')}
              hint={t('office.accept.hint')}
              maxLength={500}
              value={reasons[key] ?? ''}
              onChange={(event) => onReason(key, event.target.value)}
              error={tried && !oneLine(reasons[key] ?? '') ? t('app.required') : undefined}
            />
          </FindingItem>
        );
      })}
    </ul>
  );
}
