import { useState, type ReactNode } from 'react';
import type { Point } from '../../../../shared/panel/panelSchema';
import { CheckField } from '../../../components/form/CheckField';
import { Tag } from '../../../components/Tag';
import { useWords } from '../../../components/words';
import type { GroupBranch, ModuleBranch } from './pointTree';

interface Choosing {
  chosen: ReadonlySet<string>;
  choose: (points: readonly Point[], on: boolean) => void;
}

const countOf = (points: readonly Point[], chosen: ReadonlySet<string>) =>
  points.filter((point) => chosen.has(point.address)).length;

/** A box for many points: ticked, empty, or partly. */
function ManyBox({
  label,
  points,
  chosen,
  choose,
}: Choosing & { label: ReactNode; points: readonly Point[] }) {
  const count = countOf(points, chosen);
  return (
    <CheckField
      label={label}
      checked={count === points.length}
      ref={(box) => {
        if (box) box.indeterminate = count > 0 && count < points.length;
      }}
      onChange={() => choose(points, count < points.length)}
    />
  );
}

function GroupPoints({ group, chosen, choose }: Choosing & { group: GroupBranch }) {
  const { t } = useWords();
  return (
    <div className="border-l border-rule pl-4">
      <ManyBox
        label={t('office.points.group', {
          group: group.tag,
          supply: group.supply ?? t('office.point.notStated'),
          n: countOf(group.points, chosen),
          of: group.points.length,
        })}
        points={group.points}
        chosen={chosen}
        choose={choose}
      />
      <div className="pl-8">
        {group.points.map((point, index) => (
          <CheckField
            key={`${point.address} ${index}`}
            checked={chosen.has(point.address)}
            onChange={(event) => choose([point], event.target.checked)}
            label={
              <>
                <Tag>{point.terminal}</Tag> <span className="font-mono">{point.address}</span>{' '}
                {point.description}
              </>
            }
          />
        ))}
      </div>
    </div>
  );
}

/** One module with its groups; closed, it draws none of its points. */
export function ModulePoints({
  module,
  chosen,
  choose,
  startOpen,
}: Choosing & { module: ModuleBranch; startOpen: boolean }) {
  const { t } = useWords();
  const [toggled, setToggled] = useState<boolean>();
  const open = toggled ?? startOpen;
  return (
    <div className="border-b border-rule py-1">
      <div className="flex items-center gap-3">
        <ManyBox
          label={
            <>
              <strong className="font-mono">{module.tag}</strong> {module.description} (
              {t('office.pointsOf', { n: countOf(module.points, chosen), of: module.points.length })})
            </>
          }
          points={module.points}
          chosen={chosen}
          choose={choose}
        />
        <button
          type="button"
          aria-expanded={open}
          aria-label={t(open ? 'office.points.hide' : 'office.points.show', { module: module.tag })}
          className="ml-auto min-h-11 min-w-11 cursor-pointer font-mono text-xl"
          onClick={() => setToggled(!open)}
        >
          {open ? '−' : '+'}
        </button>
      </div>
      {open &&
        module.groups.map((group) => (
          <GroupPoints key={group.tag} group={group} chosen={chosen} choose={choose} />
        ))}
    </div>
  );
}
