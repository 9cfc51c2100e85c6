import { useState } from 'react';
import type { BodyOf } from '../../../../shared/job/entry';
import { FieldButton } from '../../../components/field/FieldButton';
import { LineBox } from '../../../components/field/LineBox';
import { oneLine } from '../../../components/field/oneLine';
import { SignaturePad } from '../../../components/field/SignaturePad';
import type { Stroke } from '../../../components/field/strokes';
import { useWords } from '../../../components/words';

export type Picture = BodyOf<'signed'>['picture'];

interface SignFormProps {
  name: string;
  /** What the signature says. */
  meaning: string;
  /** Tells the picture as soon as there is one, undefined while there is none. */
  onPicture: (picture: Picture | undefined) => void;
}

const sameName = (a: string, b: string): boolean => oneLine(a).toLowerCase() === oneLine(b).toLowerCase();

/** The signature: drawn, or the name typed by those who cannot draw. */
export function SignForm({ name, meaning, onPicture }: SignFormProps) {
  const { t } = useWords();
  const [typing, setTyping] = useState(false);
  const [strokes, setStrokes] = useState<Stroke[]>([]);
  const [typed, setTyped] = useState('');
  const draw = (next: Stroke[]) => {
    setStrokes(next);
    onPicture(next.length > 0 ? { strokes: next } : undefined);
  };
  const type = (next: string) => {
    setTyped(next);
    onPicture(sameName(next, name) ? { typed: name } : undefined);
  };
  return (
    <section className="grid gap-2 border-t-2 border-ink pt-2">
      <p className="m-0 font-bold">
        {meaning} <span className="font-normal text-muted">{name}</span>
      </p>
      {typing ? (
        <LineBox
          label={t('field.sign.typedName')}
          value={typed}
          autoCapitalize="words"
          maxLength={120}
          onChange={type}
          error={typed && !sameName(typed, name) ? t('field.sign.mustMatch', { name }) : undefined}
        />
      ) : (
        <SignaturePad label={t('field.sign.draw')} strokes={strokes} onChange={draw} />
      )}
      <FieldButton
        look="quiet"
        onClick={() => {
          setTyping(!typing);
          draw([]);
          setTyped('');
        }}
      >
        {t(typing ? 'field.sign.drawn' : 'field.sign.typed')}
      </FieldButton>
    </section>
  );
}
