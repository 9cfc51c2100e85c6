import { useRef, useState } from 'react';
import type { BodyOf, Entry, EntryKind } from '../../../../shared/job/entry';
import { NotSavedError } from '../../../offline/types';
import { useDeviceStore } from '../../../offline/useDevice';
import { usePin } from '../person/usePin';
import { useFieldJob } from './useFieldJob';

export interface Save {
  /**
   * Keeps one entry; resolves with it when the store has it, with undefined when nothing was kept.
   * `pinWhy` asks for the PIN first and says why.
   */
  save: <K extends EntryKind>(kind: K, body: BodyOf<K>, pinWhy?: string) => Promise<Entry | undefined>;
  saving: boolean;
  /** Why the last try was not kept; the screen keeps what was entered. */
  failed: NotSavedError['code'] | undefined;
}

/** The one way a screen saves: one at a time, PIN where it is due, and never silently. */
export function useSave(): Save {
  const store = useDeviceStore();
  const { pack, me } = useFieldJob();
  const { ask, askIfIdle } = usePin();
  const busy = useRef(false);
  const [saving, setSaving] = useState(false);
  const [failed, setFailed] = useState<NotSavedError['code']>();
  async function keep<K extends EntryKind>(kind: K, body: BodyOf<K>, pinWhy?: string) {
    const isHere = await (pinWhy === undefined ? askIfIdle() : ask(pinWhy));
    if (!isHere) return undefined;
    setFailed(undefined);
    try {
      const entry = await store.append(me.person, pack.job.id, kind, body);
      if ('vibrate' in navigator) navigator.vibrate(30);
      return entry;
    } catch (error) {
      setFailed(error instanceof NotSavedError ? error.code : 'unknown');
      return undefined;
    }
  }
  const save: Save['save'] = async (kind, body, pinWhy) => {
    // A second tap while the first is being kept must not answer twice.
    if (busy.current) return undefined;
    busy.current = true;
    setSaving(true);
    try {
      return await keep(kind, body, pinWhy);
    } finally {
      busy.current = false;
      setSaving(false);
    }
  };
  return { save, saving, failed };
}
