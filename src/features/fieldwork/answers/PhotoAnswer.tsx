import { useState, type ChangeEvent } from 'react';
import { fieldButtonClass } from '../../../components/field/fieldButtonClass';
import { useWords } from '../../../components/words';
import { useSave } from '../job/useSave';
import { StepFrame } from '../step/StepFrame';
import { useAnswer } from '../step/useAnswer';
import { SaveButton } from './SaveButton';
import { shrinkPhoto, type Photo } from './shrinkPhoto';
import type { StepOf } from './StepAnswer';

function PickButton({
  words,
  camera,
  onPick,
}: {
  words: string;
  camera: boolean;
  onPick: (file: File) => void;
}) {
  const pick = ({ target }: ChangeEvent<HTMLInputElement>) => {
    const file = target.files?.[0];
    if (file) onPick(file);
  };
  return (
    <label
      className={fieldButtonClass(
        'outlined',
        'has-[:focus-visible]:outline-3 has-[:focus-visible]:outline-ink',
      )}
    >
      {words}
      <input
        type="file"
        accept="image/*"
        {...(camera ? { capture: 'environment' as const } : {})}
        className="sr-only"
        onChange={pick}
      />
    </label>
  );
}

/** A photo, made smaller and freed of its position on this phone before anything is kept. */
export function PhotoAnswer({ step }: { step: StepOf<'photo'> }) {
  const { t } = useWords();
  const first = useSave();
  const { answer, saving, failed } = useAnswer(step);
  const [photo, setPhoto] = useState<Photo>();
  const [unreadable, setUnreadable] = useState(false);
  const take = (file: File) => {
    setUnreadable(false);
    shrinkPhoto(file).then(setPhoto, () => {
      setUnreadable(true);
    });
  };
  async function keep() {
    if (!photo) return;
    const { sha256, bytes } = photo;
    const kept = await first.save('photo', { sha256, type: 'image/jpeg', bytes, step: step.id });
    if (kept) await answer({ kind: 'photo', sha256 });
  }
  return (
    <StepFrame
      step={step}
      failed={failed ?? first.failed}
      answer={
        <>
          {photo && (
            <img
              src={photo.url}
              alt={t('field.photo.yours')}
              className="max-h-60 w-full border-2 border-ink object-contain"
            />
          )}
          {unreadable && (
            <p role="alert" className="m-0 font-bold">
              {t('field.photo.unreadable')}
            </p>
          )}
          <p className="m-0 text-[0.95rem]">{t('field.photo.onlyPrint')}</p>
          <div className="grid grid-cols-2 gap-2">
            <PickButton words={t('field.photo.take')} camera onPick={take} />
            <PickButton words={t('field.photo.choose')} camera={false} onPick={take} />
          </div>
        </>
      }
      primary={
        <SaveButton saving={saving || first.saving} disabled={!photo} onSave={keep}>
          {photo ? t('field.photo.save', { kB: Math.round(photo.bytes / 1000) }) : t('field.photo.first')}
        </SaveButton>
      }
    />
  );
}
