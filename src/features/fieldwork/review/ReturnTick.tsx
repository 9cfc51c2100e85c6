import { useWords } from '../../../components/words';

/** Marks one step to be sent back. */
export function ReturnTick({ ticked, onTick }: { ticked: boolean; onTick: (on: boolean) => void }) {
  const { t } = useWords();
  return (
    <label className="flex min-h-[3.5rem] items-center gap-3 border-2 border-edge bg-sheet px-3 has-checked:border-ink">
      <input
        type="checkbox"
        checked={ticked}
        onChange={({ target }) => {
          onTick(target.checked);
        }}
        className="h-6 w-6 shrink-0 accent-ink"
      />
      {t('field.review.tick')}
    </label>
  );
}
