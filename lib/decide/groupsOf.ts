/**
 * Maximal runs in cost order in which the odds of every pair lie within the two limits, ends included. `order` lists option
 * numbers, cheapest median first. Runs may overlap: a cannot be told from b, nor b from c, yet a may be told from c.
 * An option that can be told from both its neighbours is a run of its own.
 */
export function groupsOf(
  order: readonly number[],
  odds: Readonly<Record<number, Readonly<Record<number, number>>>>,
  unseparated: readonly [low: number, high: number],
): number[][] {
  const [low, high] = unseparated;
  const alike = (a: number, b: number): boolean => {
    const p = odds[a]![b]!;
    return p >= low && p <= high;
  };
  const groups: number[][] = [];
  let covered = 0;
  for (let first = 0; first < order.length; first++) {
    let last = first + 1;
    while (last < order.length && order.slice(first, last).every((a) => alike(a, order[last]!))) last++;
    // A run that ends no later than an earlier one lies inside it.
    if (last > covered) groups.push(order.slice(first, last));
    covered = Math.max(covered, last);
  }
  return groups;
}
