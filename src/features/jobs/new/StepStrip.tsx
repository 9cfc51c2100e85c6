import { useWords } from '../../../components/words';
import { wizardSteps, type WizardStep } from './jobDraft';

/** The steps as terminals on a strip; the current one carries its name. */
export function StepStrip({ current }: { current: WizardStep }) {
  const { t } = useWords();
  const at = wizardSteps.indexOf(current);
  return (
    <ol className="m-0 mb-6 flex max-w-[44rem] list-none items-stretch p-0">
      {wizardSteps.map((step, index) => (
        <li
          key={step}
          aria-current={index === at ? 'step' : undefined}
          className={`flex min-h-9 items-center justify-center border-2 border-ink px-3 font-mono font-semibold not-first:-ml-0.5 ${
            index < at ? 'bg-ink text-paper' : 'bg-sheet'
          } ${index === at ? 'flex-1 border-[3px]' : ''}`}
        >
          {index + 1}
          <span className={index === at ? 'ml-2 font-sans font-bold' : 'sr-only'}>
            {t(`office.new.${step}`)}
          </span>
        </li>
      ))}
    </ol>
  );
}
