import { describe, expect, it } from 'vitest';
import type { FormId, FormReach, NoReach, PlainDeck } from '../../lib/index.ts';
import { graph } from '../../notebooks/reactive/index.ts';
import { presetQuestion } from '../../notebooks/span-chart/question.ts';
import { reachDesk, type Reaches } from '../../notebooks/span-chart/reachDesk.ts';
import { turn } from '../reactive/manual.ts';

/** A desk whose walks end when the test says so. */
function desk() {
  const g = graph();
  const asked = g.input('question', presetQuestion);
  const walks: {
    readonly form: FormId;
    readonly deck: PlainDeck;
    readonly signal: AbortSignal;
    readonly at: (words: string) => void;
    readonly finish: (limitM: number | null) => Promise<void>;
    readonly fail: (error: Error) => Promise<void>;
  }[] = [];
  const one = reachDesk(
    g,
    asked,
    (form, deck, { signal, report }) =>
      new Promise<FormReach | NoReach>((resolve, reject) => {
        signal!.addEventListener('abort', () => reject(signal!.reason as Error));
        walks.push({
          form,
          deck,
          signal: signal!,
          at: (what) => report!({ done: 1, of: 2, what }),
          finish(limitM) {
            const span = { spanM: limitM ?? 0 };
            resolve({ form, deck, carries: span, fails: span } as unknown as FormReach);
            return turn();
          },
          fail(error) {
            reject(error);
            return turn();
          },
        });
      }),
  );
  const now = (): Reaches => {
    const state = g.state(one.reaches);
    if (state.state !== 'ready') throw new Error(state.state);
    return state.value;
  };
  return { g, asked, desk: one, walks, now };
}

describe('reachDesk(graph, question, reach)', () => {
  it('asks once for each form, says the span in hand and keeps what it finds', async () => {
    const { g, desk: one, walks, now } = desk();
    await turn();
    one.ask(['slab', 'truss']);
    one.ask(['slab']);
    await turn();
    expect(walks.map(({ form }) => form)).toEqual(['slab', 'truss']);
    expect(now().forms.get('slab')).toEqual({ at: '' });
    walks[0]!.at('12.0 m');
    await turn();
    expect(now().forms.get('slab')).toEqual({ at: '12.0 m' });
    await walks[0]!.finish(45);
    expect(now().forms.get('slab')).toMatchObject({ found: { form: 'slab', fails: { spanM: 45 } } });
    const limits = g.state(one.limits);
    expect('value' in limits && limits.value.map(({ form }) => form)).toEqual(['slab']);
  });

  it('left off, what is not there can be asked for again, and nothing late comes in', async () => {
    const { desk: one, walks, now } = desk();
    await turn();
    one.ask(['slab', 'truss']);
    await walks[0]!.finish(45);
    one.leaveOff();
    await turn();
    expect(walks[1]!.signal.aborted).toBe(true);
    expect([...now().forms.keys()]).toEqual(['slab']);
    await walks[1]!.finish(200);
    expect([...now().forms.keys()]).toEqual(['slab']);
    one.ask(['slab', 'truss']);
    await turn();
    expect(walks.map(({ form }) => form)).toEqual(['slab', 'truss', 'truss']);
  });

  it('another deck has limits of its own; the first one finds its own again, another opening changes none', async () => {
    const { g, asked, desk: one, walks, now } = desk();
    await turn();
    one.ask(['slab', 'truss']);
    await walks[0]!.finish(45);
    g.set(asked, { ...presetQuestion, openingM: 80 });
    await turn();
    expect(walks[1]!.signal.aborted).toBe(false);
    expect(now().forms.has('slab')).toBe(true);
    g.set(asked, { ...presetQuestion, widthM: 20 });
    await turn();
    expect(walks[1]!.signal.aborted).toBe(true);
    expect(now()).toMatchObject({ deck: { widthM: 20 } });
    expect(now().forms.size).toBe(0);
    one.ask(['slab']);
    await turn();
    expect(walks.at(-1)!.deck.widthM).toBe(20);
    g.set(asked, presetQuestion);
    await turn();
    expect([...now().forms.keys()]).toEqual(['slab']);
  });

  it('a walk that fails says why in its row', async () => {
    const { desk: one, walks, now } = desk();
    await turn();
    one.ask(['slab']);
    await walks[0]!.fail(new Error('the worker stopped'));
    expect(now().forms.get('slab')).toMatchObject({ found: { because: 'the worker stopped' } });
  });
});
