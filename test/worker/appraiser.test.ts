import { afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { appraise, memory } from '../../lib/index.ts';
import type { Appraisal, FormId, Study } from '../../lib/index.ts';
import type { Progress } from '../../notebooks/reactive/index.ts';
import { appraiseWith } from '../../notebooks/worker/appraiser.ts';
import { client } from '../../notebooks/worker/client.ts';
import { jobs } from '../../notebooks/worker/jobs.ts';
import { serve } from '../../notebooks/worker/serve.ts';
import { lowFerry } from '../appraise/studies.ts';

const turnOfTheLoop = (): Promise<void> => new Promise((resolve) => setImmediate(resolve));

/** What one appraisal at one go comes to. */
const left = memory();
let whole: Appraisal;
beforeAll(() => {
  whole = appraise(lowFerry(), left);
});

let channels: MessageChannel[];
let lines: ReturnType<typeof client<typeof jobs>>[];

beforeEach(() => {
  channels = [new MessageChannel(), new MessageChannel()];
  for (const { port1, port2 } of channels) {
    serve(port1, jobs, { now: () => performance.now(), breathe: turnOfTheLoop });
    port1.start();
    port2.start();
  }
  lines = channels.map(({ port2 }) => client<typeof jobs>(port2));
});
afterEach(() => {
  for (const { port1 } of channels) port1.close();
});

describe('appraiseWith', () => {
  it('two workers come to what one appraisal comes to, and their progress never falls', async () => {
    const told: Progress[] = [];
    const study = lowFerry();
    const result = await appraiseWith(lines)(study, { report: (progress) => told.push(progress) });
    expect(result).toEqual(whole);
    expect(told.length).toBeGreaterThan(3);
    const done = told.map((progress) => progress.done / progress.of);
    expect(done).toEqual([...done].sort((a, b) => a - b));
  });

  it('in parts comes to the same, and each part is what the whole says of its forms', async () => {
    const told: Progress[] = [];
    const parts: Appraisal[] = [];
    const result = await appraiseWith(lines)(lowFerry(), {
      report: (progress) => told.push(progress),
      handOn: (part) => parts.push(part as Appraisal),
    });
    expect(result).toEqual(whole);
    expect(result.toCome).toEqual([]);
    expect(parts).toHaveLength(1);
    const [{ options, toCome, dropped, droppedCounts, register, standing }] = parts as [Appraisal];
    expect(toCome).toEqual(['truss', 'cable-stayed']);
    const isThere = ({ form }: { readonly form: FormId }): boolean => !toCome.includes(form);
    expect(options.length).toBeGreaterThan(2);
    expect(options).toEqual(whole.options.filter(isThere));
    expect(dropped).toEqual(whole.dropped.filter(isThere));
    expect(droppedCounts).toEqual(whole.droppedCounts.filter(isThere));
    expect(register).toEqual(whole.register.filter(isThere));
    for (const { number } of options) {
      for (const other of options)
        expect(standing.odds[number]![other.number]).toBe(whole.standing.odds[number]![other.number]);
    }
    const done = told.map((progress) => progress.done / progress.of);
    expect(done).toEqual([...done].sort((a, b) => a - b));
    expect(done.at(-1)).toBe(1);
  });

  it('given up after a part it hands on no other', async () => {
    const controller = new AbortController();
    const parts: unknown[] = [];
    const given = appraiseWith(lines)(lowFerry(), {
      signal: controller.signal,
      handOn(part) {
        parts.push(part);
        controller.abort(new Error('another edit'));
      },
    });
    await expect(given).rejects.toThrow('another edit');
    for (let i = 0; i < 20; i += 1) await turnOfTheLoop();
    expect(parts).toHaveLength(1);
  });

  it('a number that a form still to come has had is not retired by a part', async () => {
    const study = lowFerry();
    const { register } = whole;
    const parts: Appraisal[] = [];
    const numbered = { ...study, options: { ...study.options, register } };
    const result = await appraiseWith(lines)(numbered, { handOn: (part) => parts.push(part as Appraisal) });
    expect(result).toEqual(appraise(numbered, left));
    expect(parts.map(({ retired }) => retired)).toEqual([[]]);
    expect(parts[0]!.register).toEqual(register);
  });

  it('an option kept by hand is worked out though its form is not asked for', async () => {
    const study = lowFerry();
    const { units } = whole.options.find(({ form }) => form === 'truss')!;
    const kept = [{ number: 7, form: 'truss' as const, method: 'crane' as const, units, depthM: null }];
    const options: Study['options'] = { ...study.options, forms: ['composite-i', 'concrete-box'], kept };
    const edited = { ...study, options };
    const result = await appraiseWith(lines)(edited);
    expect(result.options.map(({ number }) => number)).toContain(7);
    expect(result).toEqual(appraise(edited, left));
  });

  it('work that is given up rejects with the reason, and the workers go on to the next', async () => {
    const controller = new AbortController();
    const study = lowFerry();
    const given = appraiseWith(lines)(study, { signal: controller.signal });
    controller.abort(new Error('another edit'));
    await expect(given).rejects.toThrow('another edit');
    expect((await appraiseWith(lines)(study)).options.length).toBeGreaterThan(3);
  });

  it('a study that cannot be served rejects with the error of the pipeline', async () => {
    const study = lowFerry();
    const books = { ...study.books, ratePack: 'none' };
    await expect(appraiseWith(lines)({ ...study, books })).rejects.toThrow(/rate pack: expected one of/u);
  });
});
