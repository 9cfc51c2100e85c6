/** A screen stops noise only when it is earthed, and at low frequencies only when it is earthed at one end. */
import { found, missing, titleOf, type RuleAt } from '../rule';
import { settleOnSite } from '../settleOnSite';

const id = 'wire.screen';

/** Both ends earthed lets earth currents through an analogue signal's screen; for fast signals both ends are right (reference §9.3). */
const isAnalogue = (kind: string | undefined): boolean =>
  kind === 'analogue-input' || kind === 'analogue-output';

export const screen: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'IEEE 525; reference §9.3: one end for low-frequency signals',
  appliesTo: 'point',
  check: ({ point, path, where, module }) => {
    const { cable, conductors = [] } = point;
    const drawn = cable?.screened === true || conductors.some(({ role }) => role === 'screen');
    if (!drawn) return [];
    const end = cable?.screenEarthed;
    if (end === undefined) return [missing(`${path}.cable.screenEarthed`)];
    const wrong = end === 'none' || (end === 'both' && isAnalogue(module?.io.kind));
    if (!wrong) return ['ok'];
    return [
      found(id, {
        harm: 'fails',
        where,
        variant: end,
        params: { cable: cable?.tag ?? point.wire },
        remedy: { says: { key: 'remedy.wire.screen' } },
        addsSteps: settleOnSite(id, where),
      }),
    ];
  },
};
