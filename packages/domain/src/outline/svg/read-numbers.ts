const number = /[\s,]*([-+]?(?:\d+\.?\d*|\.\d+)(?:e[-+]?\d+)?)/iy;

/** Numbers set apart by spaces or commas; null where there is anything else, or what is no number. */
export function readNumbers(text: string): number[] | null {
  const numbers: number[] = [];
  number.lastIndex = 0;
  let end = 0;
  for (let found = number.exec(text); found; found = number.exec(text)) {
    numbers.push(Number(found[1]));
    end = number.lastIndex;
  }
  const whole = /^[\s,]*$/.test(text.slice(end));
  return whole && numbers.every(Number.isFinite) ? numbers : null;
}
