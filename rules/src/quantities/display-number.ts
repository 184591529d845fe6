const MAX_DIGITS = 9;

/** A number as people read it: three decimals below ten, fewer above, no trailing zeros. */
export function displayNumber(value: number): string {
  const size = Math.abs(value);
  const decimals = size >= 1000 ? 0 : size >= 100 ? 1 : size >= 10 ? 2 : 3;
  return withThousands(Number(value.toFixed(decimals)));
}

/** The value with as many decimals as it takes to tell it from the limit it is held against. */
export function displayBeside(value: number, limit: number): string {
  for (let decimals = 3; decimals <= MAX_DIGITS; decimals += 1) {
    const shown = Number(value.toFixed(decimals));
    if (displayNumber(value) !== displayNumber(limit)) return displayNumber(value);
    if (shown !== Number(limit.toFixed(decimals))) return withThousands(shown);
  }
  return displayNumber(value);
}

/** A number inside a sentence: two decimals below ten, one below a hundred, none above; no trailing zeros. */
export function readingNumber(value: number): string {
  const short = shortened(value);
  return short === 0 ? displayNumber(value) : withThousands(short);
}

/** The same beside a limit: more decimals where fewer would hide on which side of the limit the value lies. */
export function readingBeside(value: number, limit: number): string {
  const isTold = value === limit || Math.sign(shortened(value) - limit) === Math.sign(value - limit);
  return isTold ? readingNumber(value) : displayBeside(value, limit);
}

function shortened(value: number): number {
  const size = Math.abs(value);
  return Number(value.toFixed(size >= 100 ? 0 : size >= 10 ? 1 : 2));
}

function withThousands(value: number): string {
  const [whole = '0', fraction] = String(value).split('.');
  const grouped = whole.replace(/\B(?=(\d{3})+(?!\d))/g, ',');
  return fraction === undefined ? grouped : `${grouped}.${fraction}`;
}
