import type { Language } from '../../../../shared/api/common';
import type { Text } from '../../../../shared/panel/says';

import type { Here } from '../../../components/field/here';
import { markTags, withoutMarks } from '../../../components/field/tagMarks';
import { renderHeld } from '../../../components/wording/held';
import type { LocalJob } from '../../../offline/types';
import { folded } from './folded';
import { panelTags } from './panelTags';
import type { FieldJob } from './useFieldJob';

/** Everything the screens of one job read, from what this phone holds. */
export function fieldJobOf(local: LocalJob, me: Here, language: Language): FieldJob {
  const { pack } = local;
  const tags = panelTags(pack.panel);
  const steps = new Map(pack.checklist.steps.map((step) => [step.id, step]));
  const marked = (text: Text) =>
    renderHeld(
      language,
      markTags(text, (word) => tags.has(word)),
      pack.wording[language],
    );
  const people = [...pack.people, ...local.facts.people];
  return {
    local,
    pack,
    state: folded(local),
    me,
    part: pack.people.find(({ id }) => id === me.person)?.part,
    marked,
    plain: (text) => withoutMarks(marked(text)),
    nameOf: (person) => people.find(({ id }) => id === person)?.name ?? '?',
    stepOf: (id) => steps.get(id),
  };
}
