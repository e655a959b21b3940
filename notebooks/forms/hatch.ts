import type { FormId } from '../model.ts';
import { formIds } from '../model.ts';
import { colours } from '../drawing/ink.ts';
import type { Piece } from '../drawing/piece.ts';
import { el } from '../drawing/piece.ts';
import type { HatchRule } from './formLook.ts';
import { formLooks } from './formLook.ts';

const stroke = (d: string, width: number, dash?: string): Piece =>
  el('path', { d, fill: 'none', stroke: colours.ink, 'stroke-width': width, 'stroke-dasharray': dash });

/** Parallel lines are ruled upright in the pattern's own field and the field is turned. */
function lines(rule: Extract<HatchRule, { kind: 'lines' }>, id: string): Piece {
  const dash = rule.dash;
  const height = dash === undefined ? 8 : (dash[0] + dash[1]) * 2;
  // Broken lines are staggered by half their step from one line to the next, as a draughtsman rules them.
  const columns = dash === undefined ? 1 : 2;
  const marks = Array.from({ length: columns }, (_, column) =>
    rule.offsets.map((offset, index) => {
      const x = offset + column * rule.apart + (rule.widths[index] ?? 0.7) / 2;
      if (dash === undefined) return stroke(`M${String(x)},0V${String(height)}`, rule.widths[index] ?? 0.7);
      const shift = column * (dash[0] + dash[1]) * 0.5;
      return stroke(
        `M${String(x)},${String(-shift)}V${String(height)}`,
        rule.widths[index] ?? 0.7,
        dash.join(' '),
      );
    }),
  );
  const turn = rule.angle === 90 ? 0 : rule.angle === 0 ? 90 : rule.angle === 45 ? 45 : -45;
  return el(
    'pattern',
    {
      id,
      patternUnits: 'userSpaceOnUse',
      width: rule.apart * columns,
      height,
      patternTransform: turn === 0 ? undefined : `rotate(${String(turn)})`,
    },
    marks,
  );
}

function crossed(rule: Extract<HatchRule, { kind: 'crossed' }>, id: string): Piece {
  const side = rule.apart;
  return el(
    'pattern',
    { id, patternUnits: 'userSpaceOnUse', width: side, height: side, patternTransform: 'rotate(45)' },
    stroke(`M0,${String(side / 2)}H${String(side)}M${String(side / 2)},0V${String(side)}`, rule.width),
  );
}

function arcs(rule: Extract<HatchRule, { kind: 'arcs' }>, id: string): Piece {
  const { radius: r, apart, turned } = rule;
  const foot = turned ? 0.6 : apart - 0.6;
  const sag = turned ? apart * 1.1 : -apart * 0.1;
  // Neighbouring tiles overlap, so each arc is ruled in three places to meet its edges cleanly.
  const d = [-1, 0, 1]
    .map(
      (step) =>
        `M${String(step * 2 * r)},${String(foot)}q${String(r)},${String((sag - foot) * 1.4)} ${String(2 * r)},0`,
    )
    .join('');
  return el(
    'pattern',
    { id, patternUnits: 'userSpaceOnUse', width: 2 * r, height: apart },
    stroke(d, rule.width),
  );
}

/** Name under which a drawing with the given prefix keeps a form's hatch. */
export const hatchId = (prefix: string, form: FormId): string => `${prefix}-hatch-${form}`;

/** The hatch of one form as a pattern, to be put into the `defs` of a drawing. */
export function hatch(form: FormId, prefix: string): Piece {
  const rule = formLooks[form].hatch;
  const id = hatchId(prefix, form);
  return rule.kind === 'lines'
    ? lines(rule, id)
    : rule.kind === 'crossed'
      ? crossed(rule, id)
      : arcs(rule, id);
}

/** Hatches of several forms, in the order in which forms are listed everywhere. */
export const hatches = (forms: Iterable<FormId>, prefix: string): Piece[] => {
  const asked = new Set(forms);
  return formIds.filter((form) => asked.has(form)).map((form) => hatch(form, prefix));
};
