import type { FindingsAnswer } from '../../../shared/api/panels';
import { FindingItem } from '../../components/findings/FindingItem';
import { SignalBox } from '../../components/SignalBox';
import { useWords } from '../../components/words';

/** What keeps a draft from being issued, and which findings will stop every job on what they touch. */
export function IssueBlocked({ problems, findings }: Pick<FindingsAnswer, 'problems' | 'findings'>) {
  const { t } = useWords();
  const hurts = findings.filter((finding) => finding.harm === 'hurts');
  return (
    <>
      {problems.length > 0 && (
        <>
          <p className="font-bold">{t('office.issue.problems')}</p>
          <ul tabIndex={0} aria-label={t('app.reasons')} className="max-h-60 list-disc overflow-auto pl-5">
            {problems.map((problem, index) => (
              <li key={index}>
                <code className="font-mono wrap-anywhere">{problem.path}</code> {problem.says}
              </li>
            ))}
          </ul>
        </>
      )}
      {hurts.length > 0 && (
        <SignalBox signal="danger">
          <p className="m-0 font-bold">{t('office.issue.hurts')}</p>
          <ul className="m-0 list-none p-0">
            {hurts.map((finding) => (
              <FindingItem key={`${finding.rule} ${finding.place}`} finding={finding} />
            ))}
          </ul>
        </SignalBox>
      )}
    </>
  );
}
