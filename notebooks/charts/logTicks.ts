const mantissas = [1, 1.2, 1.4, 1.6, 1.8, 2, 2.5, 3, 3.5, 4, 5, 6, 7, 8, 9] as const;

/**
 * Round values for a log axis between two values, thinned so that neighbours stand at least `apart` px from each other;
 * whole powers of ten stay first.
 */
export function logTicks(low: number, high: number, place: (value: number) => number, apart = 15): number[] {
  if (!(low > 0) || !(high > low)) return [];
  const all: { readonly value: number; readonly rank: number }[] = [];
  for (let power = 10 ** Math.floor(Math.log10(low)); power <= high; power *= 10) {
    for (const m of mantissas) {
      const value = Number((m * power).toPrecision(3));
      if (value >= low && value <= high)
        all.push({ value, rank: m === 1 ? 0 : m === 2 || m === 5 ? 1 : Number.isInteger(m) ? 2 : 3 });
    }
  }
  const taken: number[] = [];
  for (const { value } of [...all].sort((a, b) => a.rank - b.rank || a.value - b.value)) {
    if (taken.every((other) => Math.abs(place(other) - place(value)) >= apart)) taken.push(value);
  }
  return taken.sort((a, b) => a - b);
}
