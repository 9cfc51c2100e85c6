import { useEffect, useRef } from 'react';
import type { Step } from '../../../../shared/checklist/types';
import { MarkedText } from '../../../components/field/MarkedText';
import { SignalBox } from '../../../components/SignalBox';
import { useWords } from '../../../components/words';
import { useFieldJob } from '../job/useFieldJob';
import { placeLine } from './placeLine';
import { StepPicture } from './StepPicture';
import { StepStanding } from './StepStanding';

function PlaceWords({ step }: { step: Step }) {
  const { t } = useWords();
  const { pack } = useFieldJob();
  const place = placeLine(pack.checklist, step);
  const words =
    place.in === 'point'
      ? t('field.place.point', {
          point: place.point,
          points: place.points,
          step: place.step,
          steps: place.steps,
        })
      : t(place.readings ? 'field.place.readings' : 'field.place.part', {
          part: place.part,
          parts: place.parts,
          step: place.step,
          steps: place.steps,
        });
  return <p className="m-0 text-[0.95rem] leading-tight text-muted">{words}</p>;
}

/** The instruction with its tags in boxes, warnings, details and picture. Focus goes to the heading of each new step. */
export function StepWords({ step }: { step: Step }) {
  const { marked } = useFieldJob();
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => {
    heading.current?.focus({ preventScroll: true });
    window.scrollTo(0, 0);
  }, [step.id]);
  return (
    <>
      <div className="grid gap-1">
        <PlaceWords step={step} />
        <h1 ref={heading} tabIndex={-1} className="m-0 font-bold text-[1.55rem] leading-[1.25] outline-none">
          <MarkedText text={marked(step.title)} />
        </h1>
      </div>
      <StepStanding step={step} />
      {step.warnings?.map((warning, index) => (
        <SignalBox key={index} signal={warning.signal}>
          <MarkedText text={marked(warning.says)} look="bold" />
        </SignalBox>
      ))}
      <StepPicture step={step} />
      {step.detail?.map((detail, index) => (
        <p key={index} className="m-0 leading-snug">
          <MarkedText text={marked(detail)} look="bold" />
        </p>
      ))}
    </>
  );
}
