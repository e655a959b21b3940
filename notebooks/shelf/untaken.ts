/** A title that none of the others is: itself, else with a number behind it, 'New crossing 2'. */
export function untaken(title: string, others: readonly string[]): string {
  let next = title;
  for (let turn = 2; others.includes(next); turn += 1) next = `${title} ${turn}`;
  return next;
}
