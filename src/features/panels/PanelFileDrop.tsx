import { useState } from 'react';
import { maxPanelBytes, type Panel } from '../../../shared/panel/panelSchema';
import { FileDrop } from '../../components/FileDrop';
import { useWords } from '../../components/words';
import { PanelFileRefused } from './PanelFileRefused';
import { readPanelFile, type ReadPanel } from './readPanelFile';

interface PanelFileDropProps {
  label: string;
  busy: boolean;
  onPanel: (panel: Panel) => void;
}

/** Takes a panel file and hands on the panel, or lists why the file was refused. */
export function PanelFileDrop({ label, busy, onPanel }: PanelFileDropProps) {
  const { t, language } = useWords();
  const [refused, setRefused] = useState<{ name: string; read: Extract<ReadPanel, { ok: false }> }>();
  const take = async (file: File) => {
    setRefused(undefined);
    const read = await readPanelFile(file, language);
    if (read.ok) onPanel(read.panel);
    else setRefused({ name: file.name, read });
  };
  return (
    <>
      <FileDrop
        label={label}
        hint={t('office.panel.file.hint', { MB: maxPanelBytes / 1024 / 1024 })}
        accept=".json,application/json"
        busy={busy}
        onFile={(file) => void take(file)}
      />
      {busy && <p role="status">{t('office.panel.file.sending')}</p>}
      {refused && <PanelFileRefused name={refused.name} refused={refused.read} />}
    </>
  );
}
