/** A whole pack around the sample panel and steps, as a phone would hold it. */
import type { Pack } from '../../../shared/api/jobs';
import { digestOf } from '../../../shared/panel/canonical';
import { samplePanel } from './samplePanel';
import { sampleSteps } from './sampleSteps';
import { sampleWording } from './sampleWording';

export const electrician = {
  person: '0190a1b2-0000-7000-8000-000000000001',
  name: 'Mara Lind',
  email: 'mara@halden-quay.example',
  enrolledAt: '2026-11-30T07:00:00Z',
};
export const foreman = {
  person: '0190a1b2-0000-7000-8000-000000000002',
  name: 'Tomas Oja',
  email: 'tomas@halden-quay.example',
  enrolledAt: '2026-11-30T07:00:00Z',
};
export const jobId = '0190a1b2-0000-7000-8000-0000000000aa';

const settings: Pack['job']['site']['settings'] = {
  emergencyNumber: '112',
  musterPoint: 'Gate 2, under the lamp',
  foremanPhone: '555 0142',
  deadLimitV: 1,
  permitAsked: true,
  ferruleScheme: 'DIN 46228-4',
  instruments: [
    { make: 'Sample', number: '0417', category: 'CAT IV', ratedV: 600, checkDue: '2099-03-01' },
    { make: 'Sample', number: '0398', category: 'CAT III', ratedV: 600, checkDue: '2020-03-01' },
    { make: 'Sample', number: '0201', category: 'CAT II', ratedV: 250, checkDue: '2099-03-01' },
  ],
};

const rest: Omit<Pack, 'digest'> = {
  format: 'coldloop-pack/1',
  job: {
    id: jobId,
    number: '0233',
    due: '2026-12-04',
    words: 'Key for the basement is at the gate.',
    site: { id: '0190a1b2-0000-7000-8000-0000000000bb', name: 'Halden Quay Water Works', settings },
  },
  panel: samplePanel,
  revision: 3,
  checklist: {
    format: 'coldloop-checklist/1',
    ruleSet: 'harness',
    panelDigest: digestOf(samplePanel),
    scope: ['DI3.07', 'DI3.08', 'DO5.02'],
    isolators: ['Q1', 'F12'],
    steps: sampleSteps,
  },
  plan: {
    isolators: samplePanel.isolators.map((isolator) => ({
      isolator,
      tell: isolator.alsoFeeds ?? [],
      afterDoor: false,
      currentMustBeZero: false,
      extraMeasure: false,
    })),
    weight: 25,
    guarded: [],
    cover: [],
    otherEnergy: [],
    proven: true,
  },
  stillLive: [],
  waits: [{ supply: 'S24', t60S: 0, t1S: 5 }],
  findings: [],
  people: [
    { id: electrician.person, name: electrician.name, part: 'electrician', keys: [] },
    { id: foreman.person, name: foreman.name, part: 'foreman', keys: [] },
  ],
  wording: sampleWording,
};

export const samplePack: Pack = { ...rest, digest: digestOf(rest) };
