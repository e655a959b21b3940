import type { Standing } from '../model/index.ts';

/** Numbers of the options that an option cannot be separated from on cost, rising: of every group that holds it. */
export function levelWith({ groups }: Pick<Standing, 'groups'>, option: number): number[] {
  const together = new Set(groups.filter((group) => group.includes(option)).flat());
  together.delete(option);
  return [...together].sort((a, b) => a - b);
}
