import { useState } from 'react';
import type { Panel, Point } from '../../../../shared/panel/panelSchema';
import { TextField } from '../../../components/form/TextField';
import { useWords } from '../../../components/words';
import type { JobDraft } from './jobDraft';
import { ModulePoints } from './ModulePoints';
import { pointTree } from './pointTree';

interface PointsStepProps {
  panel: Panel;
  draft: JobDraft;
  change: (change: Partial<JobDraft>) => void;
}

// Up to this many points everything stands open; a big panel opens module by module.
const openUpTo = 64;

/** Which points: by module, by group, one by one, through a filter. */
export function PointsStep({ panel, draft, change }: PointsStepProps) {
  const { t } = useWords();
  const [filter, setFilter] = useState('');
  const chosen = new Set(draft.points);
  const modules = pointTree(panel, filter);
  const shown = modules.reduce((sum, module) => sum + module.points.length, 0);
  const choose = (points: readonly Point[], on: boolean) => {
    const next = new Set(chosen);
    for (const { address } of points)
      if (on) next.add(address);
      else next.delete(address);
    change({ points: panel.points.map((point) => point.address).filter((address) => next.has(address)) });
  };
  return (
    <div>
      <h2 className="m-0 text-lg font-bold">{t('office.new.points.ask')}</h2>
      <TextField
        label={t('office.points.filter')}
        hint={t('office.points.filter.hint')}
        value={filter}
        onChange={(event) => setFilter(event.target.value)}
      />
      <p role="status" className="m-0 mb-2 font-bold">
        {t('office.points.chosen', { n: draft.points.length, of: panel.points.length })}
      </p>
      {modules.length === 0 && <p>{t('office.points.noneMatch')}</p>}
      {modules.map((module) => (
        <ModulePoints
          key={module.tag}
          module={module}
          chosen={chosen}
          choose={choose}
          startOpen={shown <= openUpTo}
        />
      ))}
    </div>
  );
}
