import { depthBandOf, type Study } from '../../lib/index.ts';
import { depthCurve, depthTable, oncePerDepth, type DepthCurveInput } from '../charts/depthCurve.ts';
import { tableBehind } from '../charts/table.ts';
import { ofOption, ofTrial } from '../drawing/asked.ts';
import { ladder } from '../drawing/ladder.ts';
import { fixed, level } from '../format.ts';
import { h, type HtmlChild } from '../html.ts';
import { workedFigure, type LineSection, type Sheet } from '../page/index.ts';
import type { AppraisedOption } from '../model.ts';
import { depthPrice, roadWords } from './roadWords.ts';
import type { StudyCells } from './studyCells.ts';

/** Width of the curve of cost where the sheet has the room, px. */
const CURVE_PX = 660;

/** Section 4: what stands between the deciding obstacle and the road. */
export function depthSection(page: Sheet, cells: StudyCells): LineSection {
  const { asked, site, brief, books, reference, byDepth } = cells;
  const finding = page.live({ reference }, (v) => {
    const option = v.reference;
    if (!option) return '';
    if (!option.headroom) return 'Nothing has to be kept clear.';
    const rise = Math.max(option.profile.startRiseM, option.profile.endRiseM);
    const end = option.profile.startRiseM === rise ? 'start' : 'end';
    const lifted =
      rise > 0.005
        ? ['the road rises ', workedFigure(ofOption(option, `profile/${end}RiseM`), level(rise)), ' m for it']
        : option.profile.crestRadiusM === null
          ? 'the road stays where it is'
          : 'the road rises over it on a crest, its ends stay where they are';
    return [
      workedFigure(ofOption(option, 'depthM/midspan'), level(option.depthM.midspan)),
      ' m of structure leaves ',
      workedFigure(ofOption(option, 'headroom/spareM'), level(option.headroom.spareM)),
      ' m spare; ',
      lifted,
      '.',
    ];
  });
  return page.section(4, 'Depth and level', finding, [
    page.cell({
      station: '4+010',
      title: 'Depth at the obstacle',
      shows: { site, brief, books, reference },
      body: (v) => {
        const option = v.reference;
        if (!option) return h('p', { class: 'prose' }, 'No option has been worked out yet.');
        const at = option.headroom?.chainageM;
        const obstacle = v.brief.obstacles.find(
          ({ clearance }) =>
            clearance && at !== undefined && at >= clearance.fromM - 0.5 && at <= clearance.toM + 0.5,
        );
        if (!obstacle)
          return h('p', { class: 'prose' }, 'The flood decides, or nothing has to be kept clear.');
        return ladder({ site: v.site, option, obstacle, prefix: 'ladder' });
      },
      notes: (v) =>
        v.reference?.headroom && [
          h(
            'p',
            {},
            'At chainage ',
            workedFigure(
              ofOption(v.reference, 'headroom/chainageM'),
              fixed(v.reference.headroom.chainageM, 0),
            ),
            ', where least is left.',
          ),
          h('p', {}, roadWords(v.site.road, v.reference)),
          h('p', {}, depthPrice(v.reference, v.books.currency)),
        ],
    }),
    page.cell({
      station: '4+020',
      title: 'Cost against depth',
      shows: { reference, byDepth, books, asked },
      body: (v, room) => {
        const own = v.reference;
        const worked = v.byDepth.filter(({ number }) => number === own?.number);
        const points = oncePerDepth(
          worked.map((trial, i) => ({
            depthM: trial.depthM.midspan,
            cost: trial.cost.p50,
            figures: {
              depthM: ofTrial(i, ofOption(trial, 'depthM/midspan')),
              cost: ofTrial(i, ofOption(trial, 'cost/p50')),
            },
          })),
        );
        if (!own || points.length < 3) {
          return h('p', { class: 'prose' }, fewDepths(points, own?.depthM.midspan ?? null));
        }
        const input = {
          form: own.form,
          points,
          depthM: own.depthM.midspan,
          limits: depthLimits(worked),
          currency: v.books.currency,
          widthPx: Math.min(CURVE_PX, room.widthPx),
          prefix: 'cost-depth',
        };
        return [depthCurve(input), tableBehind(depthTable(input))];
      },
      notes: (v) => [
        v.reference && depthChoice(v.asked, v.reference),
        h(
          'p',
          {},
          'Spans and supports held; at each depth the unit is sized anew, and the road, its fill and the supports follow.',
        ),
      ],
    }),
  ]);
}

/** Depths that are too few for a curve, in words. */
function fewDepths(points: DepthCurveInput['points'], ownM: number | null): string {
  const steps = 'The published band, and the steps in which some beams come, leave';
  const own = points.find(({ depthM }) => ownM !== null && level(depthM) === level(ownM));
  const other = points.find((point) => point !== own);
  if (own === undefined || other === undefined) return `${steps} no other depth to compare with.`;
  const share = 100 * (other.cost / own.cost - 1);
  const dearer = `${fixed(Math.abs(share), 1)} % ${share < 0 ? 'cheaper' : 'dearer'}`;
  return `${steps} one other depth: ${level(other.depthM)} m beside ${level(own.depthM)} m, with a crossing ${dearer}.`;
}

/** How the depth of the reference was come to, and where the depths that are tried end. */
function depthChoice(study: Study, option: AppraisedOption): HtmlChild {
  const [least, most] = depthBandOf(study, option);
  const typed = study.options.kept.some(({ number, depthM }) => number === option.number && depthM !== null);
  const chosen = typed
    ? 'Its depth is typed.'
    : 'Its depth is the shallowest found within 1 % of the least cost of the whole crossing, at mean rates, whose checks and clearances hold.';
  return h(
    'p',
    {},
    `${chosen} Depths are tried no further than the published band for its spans: ${level(least)} to ${level(most)} m.`,
  );
}

/** Depths at which something ends: the last at which a check fails, the first that lifts the road or fouls a clearance. */
function depthLimits(rising: readonly AppraisedOption[]): { depthM: number; words: string }[] {
  const weak = rising.findLast(({ designs }) =>
    designs.some(({ limitingCheck }) => limitingCheck.utilisation > 1),
  );
  const check = weak?.designs
    .map(({ limitingCheck }) => limitingCheck)
    .sort((a, b) => b.utilisation - a.utilisation)[0];
  const lifts = rising.find(({ profile }) => Math.max(profile.startRiseM, profile.endRiseM) > 0.005);
  const fouls = rising.find(({ headroom }) => headroom !== null && headroom.spareM < -0.005);
  return [
    ...(weak && check ? [{ depthM: weak.depthM.midspan, words: `${check.label} is full` }] : []),
    ...(lifts && lifts !== rising[0]
      ? [{ depthM: lifts.depthM.midspan, words: 'the road rises from here' }]
      : []),
    ...(fouls ? [{ depthM: fouls.depthM.midspan, words: 'fouls a clearance from here' }] : []),
  ];
}
