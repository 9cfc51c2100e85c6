import type { FindingView } from '../../../shared/api/panels';
import { Tag } from '../Tag';

const order = ['point', 'group', 'module', 'supply', 'isolator', 'source', 'terminal'] as const;

/** The place of a finding, as tags from the drawing. */
export function WhereTags({ where }: { where: FindingView['where'] }) {
  const tags = order.flatMap((kind) => (where[kind] === undefined ? [] : [where[kind]]));
  return (
    <span className="inline-flex flex-wrap gap-1">
      {[...new Set(tags)].map((tag) => (
        <Tag key={tag}>{tag}</Tag>
      ))}
    </span>
  );
}
