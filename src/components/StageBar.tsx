/** Stages as the cells of a terminal strip: passed ones filled; `words` says the same and is what a screen reader hears. */
export function StageBar({ done, of, words }: { done: number; of: number; words: string }) {
  return (
    <div>
      <div aria-hidden="true" className="flex h-3.5 w-44 max-w-full border border-ink">
        {Array.from({ length: of }, (_, index) => (
          <span
            key={index}
            className={`flex-1 border-ink not-last:border-r ${index < done ? 'bg-ink' : 'bg-sheet'}`}
          />
        ))}
      </div>
      <span className="text-sm">{words}</span>
    </div>
  );
}
