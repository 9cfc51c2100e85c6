import { TagBox } from '../../../components/field/TagBox';
import { useWords } from '../../../components/words';
import { useFieldJob } from '../job/useFieldJob';

/** The points of the job, each to be ticked. */
export function PointTicks({ chosen, onChange }: { chosen: string[]; onChange: (points: string[]) => void }) {
  const { t } = useWords();
  const { pack } = useFieldJob();
  const points = pack.panel.points.filter(({ address }) => pack.checklist.scope.includes(address));
  return (
    <fieldset className="m-0 grid gap-2 border-0 p-0">
      <legend className="mb-1 p-0">{t('field.round.points')}</legend>
      {points.map(({ address, terminal, description }) => (
        <label
          key={address}
          className="flex min-h-[3.5rem] items-center gap-3 border-2 border-edge bg-sheet px-3 py-1 leading-tight has-checked:border-ink"
        >
          <input
            type="checkbox"
            checked={chosen.includes(address)}
            onChange={({ target }) => {
              onChange(target.checked ? [...chosen, address] : chosen.filter((each) => each !== address));
            }}
            className="h-6 w-6 shrink-0 accent-ink"
          />
          <span>
            <TagBox>{terminal}</TagBox> {description}
          </span>
        </label>
      ))}
    </fieldset>
  );
}
