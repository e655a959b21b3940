import type { At, Descriptor } from '../model/index.ts';
import { placeAt, type Context } from './at.ts';

/** A descriptor that fits a path, and where it stands there. */
export interface Match {
  readonly descriptor: Descriptor;
  readonly at: At;
}

/** Patterns that share their first steps: by the next literal step, by any step, and those that end here. */
interface Branch {
  readonly next: Map<string, Branch>;
  any: Branch | null;
  readonly ends: Entry[];
  /** Patterns that take whatever follows. */
  readonly rest: Entry[];
}

/** A descriptor with its place in the table and the names of its pattern with the steps they stand at. */
interface Entry {
  readonly descriptor: Descriptor;
  readonly order: number;
  readonly names: readonly (readonly [name: string, step: number])[];
}

const branch = (): Branch => ({ next: new Map(), any: null, ends: [], rest: [] });

function plant(root: Branch, descriptor: Descriptor, order: number): void {
  const steps = descriptor.path.split('/');
  const open = steps.at(-1) === '*';
  if (open) steps.pop();
  const names = steps.flatMap((step, i): [string, number][] =>
    step.startsWith(':') ? [[step.slice(1), i]] : [],
  );
  let at = root;
  for (const step of steps) {
    let next = step.startsWith(':') ? at.any : (at.next.get(step) ?? null);
    if (next === null) {
      next = branch();
      if (step.startsWith(':')) at.any = next;
      else at.next.set(step, next);
    }
    at = next;
  }
  (open ? at.rest : at.ends).push({ descriptor, order, names });
}

/** Finds the descriptor of a path: the first of the table whose pattern fits and whose `when` holds. */
export type Matcher = (context: Context, path: string) => Match | null;

/** A matcher over a table of descriptors. */
export function matcher(table: readonly Descriptor[]): Matcher {
  const root = branch();
  table.forEach((descriptor, order) => plant(root, descriptor, order));
  return (context, path) => {
    const steps = path.split('/');
    const fitting: Entry[] = [];
    const walk = (at: Branch, i: number): void => {
      if (i < steps.length) {
        fitting.push(...at.rest);
        const literal = at.next.get(steps[i]!);
        if (literal !== undefined) walk(literal, i + 1);
        if (at.any !== null) walk(at.any, i + 1);
      } else fitting.push(...at.ends);
    };
    walk(root, 0);
    fitting.sort((a, b) => a.order - b.order);
    for (const { descriptor, names } of fitting) {
      const known = new Map(names.map(([name, i]) => [name, steps[i]!]));
      if (descriptor.path.endsWith('/*'))
        known.set('*', steps.slice(descriptor.path.split('/').length - 1).join('/'));
      const at = placeAt(context, path, known);
      if (descriptor.when?.(at) !== false) return { descriptor, at };
    }
    return null;
  };
}
