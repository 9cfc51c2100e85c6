import { useState } from 'react';
import { Navigate, useParams } from 'react-router-dom';
import { paths } from '../../../app/paths';
import { nextFor } from '../job/engine';
import { useFieldJob } from '../job/useFieldJob';
import { useWakeLock } from '../../../components/field/useWakeLock';
import { LiveMeasure } from './LiveMeasure';
import { liveReading } from './liveReading';
import { LiveScreen } from './LiveScreen';

/** The red screen of this person's newest dead reading, while it is over its limit; a new good reading is the way out. */
export function LivePage() {
  const { step: id = '' } = useParams();
  const { pack, local, me } = useFieldJob();
  // Named by the reading it repeats: a new bad reading leads back to the red screen by itself.
  const [measuring, setMeasuring] = useState<string>();
  useWakeLock(true);
  const live = liveReading(pack.checklist, local.entries, local.facts, me.person);
  if (!live) {
    const next = nextFor(local, me.person);
    return <Navigate replace to={next ? paths.step(pack.job.id, next.id) : paths.myJob(pack.job.id)} />;
  }
  if (live.step.id !== id) return <Navigate replace to={paths.live(pack.job.id, live.step.id)} />;
  if (measuring === live.entry.id)
    return (
      <LiveMeasure
        live={live}
        onBack={() => {
          setMeasuring(undefined);
        }}
      />
    );
  return (
    <LiveScreen
      live={live}
      onMeasure={() => {
        setMeasuring(live.entry.id);
      }}
    />
  );
}
