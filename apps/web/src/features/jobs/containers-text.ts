/** 5 panels, 1 strip. */
export function containersText(
  count: number,
  form: 'panel' | 'strip',
): { unit: string; text: string } {
  const unit = count === 1 ? form : `${form}s`;
  return { unit, text: `${count} ${unit}` };
}
