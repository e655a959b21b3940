import type { Table, TableCell } from '../charts/table.ts';
import { chainage, fixed, level } from '../format.ts';
import type { AppraisedOption, Site } from '../model.ts';
import { ofOption } from './asked.ts';
import { roadNeeds, roadStretches } from './roadNeeds.ts';

const percent = (gradient: number): string => fixed(gradient * 100, 2);

/** The road of an option stretch by stretch from abutment to abutment and on its approaches, as figures. */
export function roadTable(option: AppraisedOption): Table {
  const { pieces } = option.profile;
  const whole = { fromM: pieces[0]?.fromM ?? NaN, toM: pieces.at(-1)?.toM ?? NaN };
  return {
    caption: 'The road, stretch by stretch: chainages and levels in m, gradients in per cent, radii in m',
    head: ['stretch', 'from ch', 'to ch', 'level', 'level at end', 'gradient', 'gradient at end', 'radius'],
    rows: roadStretches(option, whole).map(
      ({ piece, fromM, toM, fromLevelM, toLevelM, fromGradient, toGradient, radiusM }): TableCell[] => {
        const of = (field: string): string => ofOption(option, `profile/pieces/${String(piece)}/${field}`);
        return [
          radiusM === null ? 'straight' : radiusM < 0 ? 'crest' : 'sag',
          chainage(fromM),
          chainage(toM),
          { text: level(fromLevelM), figure: of('levelM') },
          level(toLevelM),
          { text: percent(fromGradient), figure: of('gradient') },
          percent(toGradient),
          radiusM === null ? '' : fixed(Math.abs(radiusM), 0),
        ];
      },
    ),
  };
}

/** The road level that each headroom and flood needs for the depth of an option, with what is spare, as figures. */
export function needTable(site: Site, option: AppraisedOption): Table {
  return {
    caption: 'Road levels needed for the depth of the option, m',
    head: ['for', 'from ch', 'to ch', 'lowest soffit', 'road needed', 'spare', 'at ch'],
    rows: roadNeeds(site, option).map(({ limit, fromM, toM, points, spareM, atM }): TableCell[] => {
      const { reason, levelM } = site.soffitLimits[limit]!;
      return [
        reason,
        chainage(fromM),
        chainage(toM),
        { text: level(levelM), figure: `site/soffitLimits/${String(limit)}/levelM` },
        level(Math.max(...points.map(([, m]) => m))),
        level(spareM),
        chainage(atM),
      ];
    }),
  };
}
