/** The stateless check: a panel file and a scope in, everything the engines say about them out. Nothing is kept. */
import type { z } from 'zod';
import type { PanelCheck, panelCheckRequest } from '../../../shared/api/panels';
import { checkPanel, unknownNames } from '../../../shared/checklist/panelCheck';
import { Refused } from '../../http/refused';
import { panelCheckView } from './panelCheckMapper';
import { searchClock } from './wholePanel';

/** @throws Refused 422 when the scope or the open isolators do not belong to the panel. */
export function checkFile({ language, ...input }: z.output<typeof panelCheckRequest>): PanelCheck {
  const strange = unknownNames(input);
  if (strange.length > 0) throw new Refused(422, 'invalid', {}, strange.slice(0, 200));
  return panelCheckView(checkPanel({ ...input, mayGoOn: searchClock() }), language);
}
