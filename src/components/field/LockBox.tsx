/** One padlock as a small labelled box: isolator and lock number. A lock taken off is drawn dashed. */
export function LockBox({ isolator, lock, off = false }: { isolator: string; lock: string; off?: boolean }) {
  return (
    <span
      className={`inline-block border-2 bg-sheet px-2 font-mono font-semibold whitespace-nowrap ${
        off ? 'border-dashed border-edge text-muted' : 'border-ink text-ink'
      }`}
    >
      {isolator} · {lock}
    </span>
  );
}
