import { useEffect, useRef, useState, type ReactNode } from 'react';
import { MarkedText } from '../../../components/field/MarkedText';
import { FieldButton } from '../../../components/field/FieldButton';
import { useWords } from '../../../components/words';
import { useFieldJob } from '../job/useFieldJob';
import { ownLocks } from '../job/ownLocks';
import { UnsentLine } from '../layout/UnsentLine';
import { StopSheet } from '../more/StopSheet';
import { readingWords } from '../step/unitWords';
import { deadBand, supplyStillOn } from './deadBand';
import { feeders } from './feeders';
import { FeederBox } from './FeederBox';
import { LiveLock } from './LiveLock';
import type { LiveReading } from './liveReading';
import { SignalHead } from './SignalHead';

/** Colours of the whole screen: white on red for live, ink on paper under an orange head for not dead. */
const looks = {
  live: {
    page: 'field-red bg-danger text-white',
    primary: 'danger',
    second: 'dangerOutlined',
    rule: 'border-white',
  },
  'not-dead': { page: 'bg-paper text-ink', primary: 'primary', second: 'outlined', rule: 'border-ink' },
} as const;

function Measured({ live }: { live: LiveReading }) {
  const { t } = useWords();
  const { marked } = useFieldJob();
  const { dead } = live.ask;
  return (
    <p className="m-0 text-[1.25rem] leading-normal">
      {t('field.live.measured')}{' '}
      <b className="font-mono text-[1.5rem] whitespace-nowrap">
        {readingWords(live.value, live.ask.unit, t)}
      </b>{' '}
      {dead ? (
        <>
          {t('field.live.at')} <b className="font-mono whitespace-nowrap">{dead.terminal}</b>{' '}
          {t('field.live.to')} <b className="font-mono whitespace-nowrap">{dead.second}</b>
        </>
      ) : (
        <MarkedText text={marked(live.step.title)} look="bold" />
      )}
      .
    </p>
  );
}

function LiveFoot({ children, rule }: { children: ReactNode; rule: string }) {
  return (
    <footer className={`field-foot border-t-2 ${rule}`}>
      <UnsentLine />
      <div className="grid gap-2 px-3 py-2.5">{children}</div>
    </footer>
  );
}

/** What was measured, step back, what can feed the terminal from the energy graph, and whom to call. */
export function LiveScreen({ live, onMeasure }: { live: LiveReading; onMeasure: () => void }) {
  const { t } = useWords();
  const { pack, state, me } = useFieldJob();
  const [locking, setLocking] = useState(false);
  const [calling, setCalling] = useState(false);
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => {
    heading.current?.focus({ preventScroll: true });
    if ('vibrate' in navigator) navigator.vibrate([200, 100, 200]);
  }, [live.entry.id]);
  const stillOn = supplyStillOn(pack.panel, live.ask, live.value);
  const band = stillOn ? 'live' : deadBand(live.ask, live.value);
  const look = looks[band === 'live' ? 'live' : 'not-dead'];
  const locked = new Set(ownLocks(state, me.person).map(({ isolator }) => isolator));
  const reasons = feeders(pack.panel, live.ask, locked);
  const go = reasons.flatMap((each) => (each.why === 'path' && each.open ? [each.open] : []))[0];
  return (
    <div className={`field-page text-[1.125rem] ${look.page}`}>
      <SignalHead band={band} />
      <main className="field-main">
        <div className="field-words">
          <h1 ref={heading} tabIndex={-1} className="m-0 font-bold text-[2.3rem] leading-[1.12] outline-none">
            {t(band === 'live' ? 'field.live.live' : 'field.live.notDead')}
            <br />
            {t(band === 'live' ? 'field.live.stepBack' : 'field.live.findOut')}
          </h1>
          <Measured live={live} />
          {stillOn && (
            <p className="m-0 font-bold">{t('field.live.stillOn', { supply: stillOn.tag, V: stillOn.V })}</p>
          )}
          <h2 className={`m-0 mt-1 border-t-2 font-bold pt-3 text-[1.1rem] ${look.rule}`}>
            {t('field.live.whatFeeds')}
          </h2>
          <ul className="m-0 grid list-none gap-2 p-0">
            {reasons.map((feeder, index) => (
              <FeederBox key={index} feeder={feeder} />
            ))}
          </ul>
        </div>
      </main>
      <LiveFoot rule={look.rule}>
        {go && (
          <FieldButton
            look={look.primary}
            className="min-h-[3.75rem] text-[1.2rem]"
            onClick={() => {
              setLocking(true);
            }}
          >
            {t('field.live.goLock', { isolator: go.tag })}
          </FieldButton>
        )}
        <div className="flex gap-2 [&>*]:flex-1">
          <FieldButton look={go ? look.second : look.primary} onClick={onMeasure}>
            {t('field.out.again')}
          </FieldButton>
          <FieldButton
            look={look.second}
            onClick={() => {
              setCalling(true);
            }}
          >
            {t('field.live.call')}
          </FieldButton>
        </div>
      </LiveFoot>
      {locking && go && (
        <LiveLock
          isolator={go}
          onClose={() => {
            setLocking(false);
          }}
        />
      )}
      {calling && (
        <StopSheet
          pack={pack}
          onClose={() => {
            setCalling(false);
          }}
        />
      )}
    </div>
  );
}
