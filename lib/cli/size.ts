import { bandOf, deckDepth, taskAt } from '../appraise/deckDepth.ts';
import { carryingWords } from '../appraise/carryingWords.ts';
import { depthMissed } from '../appraise/depthMissed.ts';
import { depthRulings } from '../appraise/depthRulings.ts';
import { DEEPEST_M } from '../appraise/depthThatCarries.ts';
import { liftedSupports } from '../appraise/liftedSupports.ts';
import { limitingSpan, type SpanTried } from '../appraise/limitingSpan.ts';
import { finish } from '../appraise/work.ts';
import { cannotCarry, formModule } from '../forms/index.ts';
import type { Design } from '../model/index.ts';
import { meanRates, ratesFor } from '../price/index.ts';
import { itemOf, perM2, splitQuantities } from '../takeoff/index.ts';
import { refuse } from './refusal.ts';
import { rounded } from './rounded.ts';
import { jsonText, type Said } from './said.ts';
import { readTask, type Asked } from './sizeTask.ts';

/** The least that can be asked for as a depth, m. */
const FLATTEST_M = 0.01;

/** A reason of a rule as a sentence. */
function sentenceOf(reason: string): string {
  return `${reason[0]!.toUpperCase()}${reason.slice(1)}.`;
}

/** Mean rates of the pack that comes with the tool. */
const demoRates = (): Readonly<Record<string, number>> =>
  meanRates(ratesFor({ ratePack: 'demo-2026', rates: [] }));

/** The depth asked for, or that of least cost; what cannot carry, or cannot be made near to the depth asked for, is refused. */
function designOf(asked: Asked): Design {
  const module = formModule(asked.task.form);
  const sizeAt = (depthM: number): Design => module.size(taskAt(asked, depthM));
  if (asked.depthM === undefined) {
    const { depthM, triedToM } = finish(deckDepth(asked, demoRates()));
    const design = sizeAt(depthM);
    if (cannotCarry([design]) === null) return design;
    const band = bandOf(asked);
    const deeper =
      triedToM === null
        ? ''
        : `, and deeper ones beyond it to ${rounded(sizeAt(triedToM).depthM.midspan)} m,`;
    return refuse([
      {
        code: 'refused',
        path: ['--spans'],
        expected: 'spans that the form can carry, all checks within their limits',
        received: `${asked.task.spansM.join(',')} m, of which none can be built: nearest at ${rounded(depthM)} m deep, ${carryingWords(design)}`,
        remedy: `Depths of the published band, ${band.map((end) => rounded(end)).join(' to ')} m${deeper} do not carry: give shorter spans, fewer lanes or another form`,
      },
    ]);
  }
  const design = sizeAt(asked.depthM);
  if (depthMissed(design) !== null) refuseWhatBeamsCannotMake(asked.depthM, sizeAt);
  if (cannotCarry([design]) === null) return design;
  return refuse([
    {
      code: 'refused',
      path: ['--depth'],
      expected: 'a depth at which all checks are within their limits',
      received: `${asked.depthM} m, ${carryingWords(design)}`,
      remedy: 'leave --depth out for that of least cost that carries, or give shorter spans',
    },
  ]);
}

/** Beams come in steps of depth: a depth shallower or deeper than all of them is refused. */
function refuseWhatBeamsCannotMake(depthM: number, sizeAt: (depthM: number) => Design): void {
  const [least, most] = [FLATTEST_M, DEEPEST_M].map((end) => sizeAt(end).depthM.midspan) as [number, number];
  if (depthM >= least && depthM <= most) return;
  refuse([
    {
      code: depthM < least ? 'too-small' : 'too-large-value',
      path: ['--depth'],
      expected: `a depth this form can be made with, ${rounded(least)} to ${rounded(most)}`,
      received: String(depthM),
      unit: 'm',
      remedy: 'give a depth between them, or leave --depth out for that of least cost',
    },
  ]);
}

/** A span that was worked out, as it is printed. */
function spanOut(tried: SpanTried | null): object | null {
  if (tried === null) return null;
  const { spanM, design, triedToM } = tried;
  const { id, label, demand, capacity, unit, utilisation } = design.limitingCheck;
  return {
    spanM,
    spans: design.task.spansM,
    depthM: design.depthM,
    publishedDepthM: bandOf({ task: design.task, haunch: 1 }),
    triedToDepthM: triedToM,
    ownWeightShare: design.ownWeightShare,
    limitingCheck: { id, label, demand, capacity, unit, utilisation },
  };
}

/** How far the form reaches, saying each span that is tried. */
function limitOf(asked: Asked, say: (line: string) => void): Said {
  const work = limitingSpan(asked, demoRates());
  let saidM = 0;
  for (;;) {
    const next = work.next();
    if (!next.done) {
      if (next.value !== saidM) say(`trying a span of ${next.value.toFixed(1)} m`);
      saidM = next.value;
      continue;
    }
    const { carries, fails, ownWeightHalfM, ownWeight80M } = next.value;
    return {
      out: jsonText(
        rounded({
          form: asked.task.form,
          limitingSpanM: carries !== null && fails !== null ? fails.spanM : null,
          limit: fails?.design.limitingCheck.label ?? null,
          carries: spanOut(carries),
          fails: spanOut(fails),
          ownWeightHalfM,
          ownWeight80M,
        }),
      ),
    };
  }
}

/**
 * `size --form ID --spans 60,80,60 --width 12 --lanes 3 [--depth 3.1] ...`: quantities, take-off by part and checks of one unit, as JSON.
 * `--skew` is the skew of the supports from square, degrees, either way; spans are those along the road.
 * Without a depth the one of least cost in the published band is taken, beyond it where none inside carries. What cannot
 * carry is refused with the checks that stand in the way. Concrete boxes read `--box-width`
 * (between the axes of the outer webs, m), `--strength` (MPa), `--light` (oven-dry density, kg/m3; with `--light-middles`
 * only a length about the middle of each span, m), and `--ballast` (kN/m by span); cantilevered ones `--cast-in` (piers in
 * the middle that the deck is cast in with).
 * `--limit` asks instead how far the form reaches with spans in this proportion: see `limitingSpan`.
 *
 * @param say takes lines about progress of long work
 */
export function sizeCommand(argv: readonly string[], say: (line: string) => void = () => {}): Said {
  const asked = readTask(argv);
  if (asked.limit) return limitOf(asked, say);
  const { form, spansM, deck } = asked.task;
  const design = designOf(asked);
  const missed = depthMissed(design);
  const { superstructure, supports } = splitQuantities(design.lines);
  const deckAreaM2 = spansM.reduce((sum, span) => sum + span, 0) * deck.widthM;
  return {
    out: jsonText(
      rounded({
        form,
        spans: spansM,
        deckAreaM2,
        depthM: design.depthM,
        quantities: superstructure,
        perM2: perM2(superstructure, deckAreaM2),
        supports,
        lines: design.lines.map(({ part, item, what, quantity, how }) => ({
          part,
          item,
          what,
          quantity,
          unit: itemOf(item).unit,
          how,
        })),
        checks: design.checks.map(({ id, label, utilisation }) => ({ id, label, utilisation })),
        limitingCheck: design.limitingCheck.id,
        ownWeightShare: design.ownWeightShare,
        warnings: [
          ...(asked.depthM === undefined || missed === null ? [] : [missed]),
          ...design.warnings,
          ...depthRulings(design).map(
            ({ because, source }) => `${sentenceOf(because[0]!)} Source: ${source}.`,
          ),
          ...liftedSupports(design),
        ],
      }),
    ),
  };
}
