import { useState } from 'react';
import type { FindingView } from '../../../shared/api/panels';
import type { Panel, Point } from '../../../shared/panel/panelSchema';
import { Button } from '../../components/Button';
import { Table, type Column } from '../../components/Table';
import { Tag } from '../../components/Tag';
import { TextField } from '../../components/form/TextField';
import { useWords } from '../../components/words';
import { PointLoop } from './PointLoop';

// A panel may hold 20,000 points: the table draws what a person can read and grows on request.
const pageSize = 100;

const matches = (point: Point, filter: string) =>
  `${point.address} ${point.terminal} ${point.wire} ${point.group} ${point.description}`
    .toLowerCase()
    .includes(filter.toLowerCase());

interface PointsTableProps {
  panel: Panel;
  /** Those known so far: they are marked in the loop of a point. */
  findings?: readonly FindingView[] | undefined;
}

/** The points of a panel, in their order, with a filter; each opens its loop. */
export function PointsTable({ panel, findings = [] }: PointsTableProps) {
  const { t } = useWords();
  const [filter, setFilter] = useState('');
  const [shown, setShown] = useState(pageSize);
  const [looked, setLooked] = useState<Point>();
  const points = panel.points.filter((point) => matches(point, filter));
  const columns: Column<Point & { index: number }>[] = [
    {
      head: t('office.point.address'),
      className: 'md:w-32',
      cell: (point) => (
        <button
          type="button"
          aria-label={t('office.point.loop', { address: point.address })}
          className="min-h-11 cursor-pointer"
          onClick={() => setLooked(point)}
        >
          <Tag>{point.address}</Tag>
        </button>
      ),
    },
    { head: t('office.point.terminal'), className: 'md:w-28', cell: (point) => <Tag>{point.terminal}</Tag> },
    { head: t('office.point.group'), className: 'md:w-28', cell: (point) => point.group },
    { head: t('office.point.what'), cell: (point) => point.description },
    {
      head: t('office.point.device'),
      className: 'md:w-44',
      cell: (point) => t(`office.device.${point.device.kind}`),
    },
    {
      head: t('office.point.otherSupply'),
      className: 'md:w-40',
      cell: (point) =>
        point.otherSupply === undefined ? (
          t('office.point.notStated')
        ) : point.otherSupply === 'none' ? (
          t('office.point.noOther')
        ) : (
          <Tag>{point.otherSupply}</Tag>
        ),
    },
  ];
  return (
    <>
      <TextField
        label={t('office.points.filter')}
        value={filter}
        onChange={(event) => setFilter(event.target.value)}
      />
      <p role="status" className="m-0 mb-2 text-muted">
        {t('office.points.count', { n: points.length, of: panel.points.length })}
      </p>
      <Table
        caption={t('office.points')}
        columns={columns}
        rows={points.slice(0, shown).map((point, index) => ({ ...point, index }))}
        keyOf={(point) => String(point.index)}
      />
      {looked && (
        <PointLoop panel={panel} point={looked} findings={findings} onClose={() => setLooked(undefined)} />
      )}
      {points.length > shown && (
        <Button className="mt-4" onClick={() => setShown(shown + pageSize)}>
          {t('app.more')}
        </Button>
      )}
    </>
  );
}
