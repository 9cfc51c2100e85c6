import type { FindingView } from '../../../shared/api/panels';
import type { Panel, Point } from '../../../shared/panel/panelSchema';
import { Dialog } from '../../components/Dialog';
import { HarmMark } from '../../components/findings/HarmMark';
import { useWords } from '../../components/words';
import { LoopDiagram } from '../../diagrams/LoopDiagram';
import { pointFindings } from './pointFindings';

interface PointLoopProps {
  panel: Panel;
  point: Point;
  findings: readonly FindingView[];
  onClose: () => void;
}

/** The computed loop of a point over the page, with the findings that concern it where they are. */
export function PointLoop({ panel, point, findings, onClose }: PointLoopProps) {
  const { t } = useWords();
  const signed = pointFindings(panel, point, findings);
  return (
    <Dialog open title={t('office.point.loop', { address: point.address })} onClose={onClose}>
      <p className="mt-0">{point.description}</p>
      <LoopDiagram panel={panel} point={point.address} marks={signed.map(({ mark }) => mark)} />
      <ol className="m-0 list-none p-0">
        {signed.map(({ finding, mark }) => (
          <li key={`${mark.sign} ${finding.rule}`} className="border-t border-rule py-2">
            <strong className="mr-2 font-mono">{mark.sign}</strong>
            <HarmMark harm={finding.harm} /> {finding.says}
          </li>
        ))}
      </ol>
    </Dialog>
  );
}
