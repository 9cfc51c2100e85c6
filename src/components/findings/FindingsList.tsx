import type { FindingsAnswer } from '../../../shared/api/panels';
import { useWords } from '../words';
import { byHarm } from './byHarm';
import { ChecksRun } from './ChecksRun';
import { FindingItem } from './FindingItem';

/** Every finding, the worst first, under the count of the checks that ran. */
export function FindingsList({ answer }: { answer: Omit<FindingsAnswer, 'ruleSet' | 'problems'> }) {
  const { t } = useWords();
  return (
    <>
      <ChecksRun checks={answer.checks} couldNotRun={answer.couldNotRun} found={answer.findings.length} />
      <ul className="m-0 list-none p-0">
        {byHarm(answer.findings).map((finding) => (
          <FindingItem key={`${finding.rule} ${finding.place}`} finding={finding}>
            {finding.accepted && (
              <p className="mt-2 mb-0">
                {t('office.acceptedBy', { name: finding.accepted.by, reason: finding.accepted.reason })}
              </p>
            )}
          </FindingItem>
        ))}
      </ul>
    </>
  );
}
