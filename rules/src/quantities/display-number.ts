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

function withThousands(value: number): string {
  const [whole = '0', fraction] = String(value).split('.');
  const grouped = whole.replace(/\B(?=(\d{3})+(?!\d))/g, ',');
  return fraction === undefined ? grouped : `${grouped}.${fraction}`;
}
