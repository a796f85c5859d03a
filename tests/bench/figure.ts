export interface Figure {
  bench: string;
  figure: string;
  value: number;
  unit: string;
  /** What the figure should stay below or reach; null where it is only recorded. */
  goal: number | null;
}

/** One JSON line for whoever reads the output by program. */
export function report(figure: Figure): void {
  console.log(JSON.stringify({ ...figure, value: Number(figure.value.toFixed(3)) }));
}
