export interface StageCell {
  name: string;
  status: 'done' | 'current' | 'open' | 'locked';
}

function Terminal({ cell, number }: { cell: StageCell; number: number }) {
  if (cell.status === 'current')
    return (
      <span className="relative -my-1 flex shrink-0 items-center border-[3px] border-ink bg-sheet px-2.5 text-[0.82rem] font-bold whitespace-nowrap">
        {number} {cell.name}
        <span className="absolute -bottom-[8px] left-1/2 h-0 w-0 -translate-x-1/2 border-x-[6px] border-t-[6px] border-x-transparent border-t-ink" />
      </span>
    );
  const fill = cell.status === 'done' ? 'bg-ink text-paper' : 'bg-sheet text-ink';
  return (
    <span
      className={`stage-other flex min-w-0 flex-1 items-center justify-center border-ink font-mono text-[0.68rem] font-bold not-first:border-l ${fill}`}
    >
      {number}
    </span>
  );
}

/** The stages as a terminal strip: done ones are filled, the current one carries its name. `words` says it aloud. */
export function StageStrip({ cells, words }: { cells: StageCell[]; words: string }) {
  return (
    <div className="px-2 pt-2 pb-2.5">
      <p className="sr-only">{words}</p>
      <div aria-hidden="true" className="flex h-[1.6rem] border border-ink">
        {cells.map((cell, index) => (
          <Terminal key={cell.name} cell={cell} number={index + 1} />
        ))}
      </div>
    </div>
  );
}
