import { sizeableForms, type FormId, type FormReach, type NoReach, type PlainDeck } from '../../lib/index.ts';
import type { Cell, Graph, Input } from '../reactive/index.ts';
import type { Reacher } from '../worker/index.ts';
import type { Question } from './question.ts';

/** What there is of the limiting span of a form: asked for and, once it is walked to, the span in hand; or the answer. */
export type Reaching = { readonly at: string } | { readonly found: FormReach | NoReach };

/** Limiting spans of one deck as far as they have been asked for. */
export interface Reaches {
  readonly deck: PlainDeck;
  readonly forms: ReadonlyMap<FormId, Reaching>;
}

/** The limiting spans that could be said, without those still under way. */
const found = ({ forms }: Reaches): FormReach[] =>
  [...forms.values()].flatMap((one) => ('found' in one && 'carries' in one.found ? [one.found] : []));

/** Limiting spans of the deck in question: asked for form by form, told as they come, and left off when they need not be. */
export interface ReachDesk {
  readonly deck: Cell<PlainDeck>;
  readonly reaches: Input<Reaches>;
  /** Those that could be said: changes only when there is one more, or another deck. */
  readonly limits: Cell<readonly FormReach[]>;
  /** Asks for those of some forms that are not there and not under way. */
  readonly ask: (forms: readonly FormId[]) => void;
  /** Leaves off what is not there yet. */
  readonly leaveOff: () => void;
}

/** Forms whose limiting span can be asked for. */
export const reachable = sizeableForms;

const deckOf = ({ widthM, radiusM }: Question): PlainDeck => ({
  widthM,
  radiusM: radiusM === 'straight' ? Infinity : radiusM,
});

const keyOf = ({ widthM, radiusM }: PlainDeck): string => `${widthM} ${radiusM}`;

/**
 * Keeps the limiting spans of the deck in question. What has been found stays for the life of the page; another deck ends
 * what is under way, for nobody waits for it.
 */
export function reachDesk(graph: Graph, asked: Cell<Question>, reach: Reacher): ReachDesk {
  const deck = graph.cell('deck', { asked }, (v) => deckOf(v.asked), {
    equal: (a, b) => keyOf(a) === keyOf(b),
  });
  const known = new Map<string, Map<FormId, Reaching>>();
  const empty: Reaches = { deck: { widthM: NaN, radiusM: NaN }, forms: new Map() };
  const reaches = graph.input<Reaches>('limiting spans', empty);
  const limits = graph.cell('limits', { reaches }, (v): readonly FormReach[] => found(v.reaches), {
    equal: (a, b) => a.length === b.length && a.every((one, i) => one === b[i]),
  });
  let now = empty;
  let running = new AbortController();
  const tell = (forms: ReadonlyMap<FormId, Reaching>): void => {
    now = { ...now, forms };
    graph.set(reaches, now);
  };
  const put = (form: FormId, one: Reaching): void => tell(new Map(now.forms).set(form, one));
  const onlyFound = (): Map<FormId, Reaching> => new Map([...now.forms].filter(([, one]) => 'found' in one));

  const walk = async (form: FormId): Promise<void> => {
    const { signal } = running;
    const { deck: of } = now;
    put(form, { at: '' });
    try {
      const answer = await reach(form, of, {
        signal,
        report: ({ what }) => !signal.aborted && put(form, { at: what }),
      });
      const kept = known.get(keyOf(of)) ?? new Map<FormId, Reaching>();
      known.set(keyOf(of), kept.set(form, { found: answer }));
      if (!signal.aborted) put(form, { found: answer });
    } catch (error) {
      if (signal.aborted) return;
      const because = error instanceof Error ? error.message : String(error);
      put(form, { found: { form, deck: of, because } });
    }
  };
  const leaveOff = (): void => {
    running.abort();
    running = new AbortController();
    tell(onlyFound());
  };

  graph.watch(deck, (state) => {
    if (state.state !== 'ready' || keyOf(state.value) === keyOf(now.deck)) return;
    running.abort();
    running = new AbortController();
    now = { deck: state.value, forms: now.forms };
    tell(known.get(keyOf(state.value)) ?? new Map());
  });
  return {
    deck,
    reaches,
    limits,
    ask(forms) {
      for (const form of forms) if (!now.forms.has(form)) void walk(form);
    },
    leaveOff,
  };
}
