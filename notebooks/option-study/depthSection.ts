import { ofOption } from '../drawing/asked.ts';
import { ladder } from '../drawing/ladder.ts';
import { fixed, level } from '../format.ts';
import { h } from '../html.ts';
import { workedFigure, type LineSection, type Sheet } from '../page/index.ts';
import type { StudyCells } from './studyCells.ts';

/** Section 4: what stands between the deciding obstacle and the road. */
export function depthSection(page: Sheet, cells: StudyCells): LineSection {
  const { site, brief, reference } = cells;
  const finding = page.live({ reference }, (v) => {
    const option = v.reference;
    if (!option) return '';
    if (!option.headroom) return 'Nothing has to be kept clear.';
    const rise = Math.max(option.profile.startRiseM, option.profile.endRiseM);
    const end = option.profile.startRiseM === rise ? 'start' : 'end';
    const lifted =
      rise > 0.005
        ? ['the road rises ', workedFigure(ofOption(option, `profile/${end}RiseM`), level(rise)), ' m for it']
        : 'the road stays where it is';
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
      shows: { site, brief, reference },
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
          h(
            'p',
            {},
            'A free end of the road that rises by Δ adds fill of about (W h + s h²)/g for each metre on its side.',
          ),
        ],
    }),
  ]);
}
