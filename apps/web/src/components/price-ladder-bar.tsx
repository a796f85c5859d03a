interface PriceLadderBarProps {
  loses: boolean;
  misses: boolean;
  /** Shares of the ladder's width in per cent. */
  bench: number;
  allIn: number;
  target: number;
}

/** One rung between the uprights: its bar, the all-in mark on it, and the target that runs through all rungs. */
export function PriceLadderBar({ loses, misses, bench, allIn, target }: PriceLadderBarProps) {
  const standing = loses ? 'loses money' : misses ? 'misses the target' : 'reaches the target';
  return (
    <div className="relative h-12">
      <span className="sr-only">{standing}</span>
      <span
        className={`absolute top-1/2 left-0 h-3.5 -translate-y-1/2 ${barLook(loses, misses)}`}
        style={{ width: `${Math.max(bench, loses ? 16 : 2)}%` }}
      />
      {allIn > 0 && (
        <span
          className="absolute top-1/2 h-5 w-1.5 -translate-x-1/2 -translate-y-1/2 border border-card bg-ink"
          style={{ left: `${allIn}%` }}
        />
      )}
      <span
        className="absolute inset-y-0 border-l-2 border-dashed border-brass"
        style={{ left: `${target}%` }}
      />
    </div>
  );
}

function barLook(loses: boolean, misses: boolean): string {
  if (loses) return 'broken';
  return misses ? 'bg-slate' : 'rounded-r bg-verdigris';
}
