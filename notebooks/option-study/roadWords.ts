import { ofOption } from '../drawing/asked.ts';
import { fixed, radiusText } from '../format.ts';
import type { HtmlChild } from '../html.ts';
import type { AppraisedOption, Site } from '../model.ts';
import { workedFigure } from '../page/index.ts';

/** How the road runs over the bridge, how far it reaches behind it, and how it goes on behind an end that is fixed. */
export function roadWords({ fixedEnd }: Site['road'], option: AppraisedOption): HtmlChild {
  const { crestRadiusM, steepestGradient, approaches, easedFor } = option.profile;
  const figure = (field: string, text: string): HTMLElement =>
    workedFigure(ofOption(option, `profile/${field}`), text);
  return [
    crestRadiusM === null
      ? 'The road runs straight between the abutments'
      : ['The road runs over a crest of ', figure('crestRadiusM', radiusText(crestRadiusM)), ' m radius'],
    easedFor !== undefined &&
      `, sharper than what it clears asks for, which spares the curve behind the ${easedFor}`,
    ', nowhere steeper than ',
    figure('steepestGradient', fixed(100 * steepestGradient, 1)),
    ' % there; its approaches take ',
    figure('approaches/start/lengthM', fixed(approaches.start.lengthM, 0)),
    ' m at the start and ',
    figure('approaches/end/lengthM', fixed(approaches.end.lengthM, 0)),
    ' m at the end to meet the ground, which is taken as level beyond the survey.',
    (['start', 'end'] as const).map(
      (end) => (fixedEnd === end || fixedEnd === 'both') && behindWords(option, end),
    ),
  ];
}

/** How the gradient of the deck is led back to that of the existing road behind a fixed end. */
function behindWords(option: AppraisedOption, end: 'start' | 'end'): HtmlChild {
  const behind = option.profile.regrading?.[end];
  if (behind === undefined)
    return ` The gradient of the existing road behind the ${end}, which stays, is not known: no curve is laid or paid for there.`;
  const { kind, curveM, radiusM, gradientChange, apartM, lengthM, comesBack } = behind;
  const figure = (field: string, text: string): HTMLElement =>
    workedFigure(ofOption(option, `profile/regrading/${end}/${field}`), text);
  if (!(lengthM > 0)) return ` Behind the ${end} the existing road goes on without a curve.`;
  return [
    ` Behind the ${end} the gradient changes by `,
    figure('gradientChange', fixed(100 * gradientChange, 1)),
    ` %: a ${kind} of `,
    figure('radiusM', radiusText(radiusM)),
    ' m radius takes a curve behind the abutment of ',
    figure('curveM', fixed(curveM, 0)),
    ` m, at whose end the road lies ${kind === 'crest' ? 'above' : 'below'} the existing one by `,
    figure('apartM', fixed(apartM, 2)),
    comesBack
      ? [' m; it is met again after ', figure('lengthM', fixed(lengthM, 0)), ' m.']
      : ' m; it is not met again within the steepest gradient.',
  ];
}

/** What 100 mm more of construction depth would cost in the approaches. */
export function depthPrice(option: AppraisedOption, currency: string): HtmlChild {
  const { hundredMm } = option;
  if (hundredMm === null) return 'No road clears with a deck 100 mm deeper.';
  const { amount } = hundredMm;
  const figure = (field: keyof typeof hundredMm, text: string): HTMLElement =>
    workedFigure(ofOption(option, `hundredMm/${field}`), text);
  const quantities = (
    [
      ['fillM3', 'm³', 'fill'],
      ['cutM3', 'm³', 'cut'],
      ['surfacingM2', 'm²', 'surfacing'],
      ['wallM2', 'm²', 'wall'],
    ] as const
  ).filter(([field]) => Math.abs(hundredMm[field]) >= 0.5);
  if (Math.abs(amount) < 0.5) return 'Another 100 mm of depth costs nothing in the approaches.';
  return [
    amount > 0
      ? 'Another 100 mm of depth costs the approaches '
      : 'Another 100 mm of depth is taken up by the crest, whose steeper ends spare the approaches ',
    figure('amount', fixed(Math.round(Math.abs(amount) / 10) * 10, 0)),
    ` ${currency}`,
    quantities.map(([field, unit, what], i) => [
      i === 0 ? ': ' : i < quantities.length - 1 ? ', ' : ' and ',
      figure(field, fixed(Math.abs(hundredMm[field]), 0)),
      ` ${unit} ${hundredMm[field] > 0 ? 'more' : 'less'} ${what}`,
    ]),
    '.',
  ];
}
