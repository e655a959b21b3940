import { limitM, reachPath, spanWindow, type FormId, type FormReach } from '../../lib/index.ts';
import { fixed, length, reachText } from '../format.ts';
import { formLooks } from '../forms/formLook.ts';
import { h, type HtmlChild } from '../html.ts';
import { pushed, workedFigure } from '../page/index.ts';
import { reachable, type ReachDesk, type Reaches, type Reaching } from './reachDesk.ts';

/** An action, called by its words and what they are of. */
const action = (words: string, of: string, key: string, act: () => void): HTMLElement =>
  h(
    'button',
    { type: 'button', class: 'action', 'data-key': key, 'aria-label': `${words}: ${of}`, onclick: act },
    words,
  );

/** What ends the spans of a form, and how deep and heavy it is there. */
function reachCells(reach: FormReach): readonly HtmlChild[] {
  const { form, carries, fails } = reach;
  const limit = limitM(reach);
  if (carries === null) {
    const why = fails === null ? '' : `: ${fails.check.label}`;
    return ['none', `no span up to the usual ones carries${why}`, '', ''];
  }
  const figure = (name: string, words: string): HTMLElement => workedFigure(reachPath(form, name), words);
  const beyond = carries.triedToM === null ? '' : ', deeper than the published band';
  return [
    limit === null
      ? ['over ', figure('carries/spanM', reachText(carries.spanM))]
      : figure('spanM', reachText(limit)),
    fails === null || limit === null ? 'as far as it can be laid out' : fails.check.label,
    [figure('carries/depthM', fixed(carries.depthM.support, 2)), beyond],
    figure('carries/ownWeightShare', fixed(carries.ownWeightShare, 2)),
  ];
}

function stateCells(desk: ReachDesk, form: FormId, one: Reaching | undefined): readonly HtmlChild[] {
  if (one === undefined) {
    const of = `limiting span of this deck, ${formLooks[form].short}`;
    return [action('work it out', of, `reach.${form}`, () => desk.ask([form])), '', '', ''];
  }
  if ('at' in one) return [one.at === '' ? 'waits' : `tries ${one.at}`, '', '', ''];
  if ('because' in one.found) return ['none', one.found.because, '', ''];
  return reachCells(one.found);
}

/** Every form that is sized, with the limiting span of the deck where it has been asked for. */
export function reachTable(desk: ReachDesk, { forms }: Reaches): HTMLElement {
  const head = [
    'form',
    'longest by rule, m',
    'limiting span, m',
    'ended by',
    'depth before it, m',
    'share of own weight',
  ];
  const open = reachable.filter((form) => !forms.has(form));
  const isRunning = [...forms.values()].some((one) => 'at' in one);
  return h(
    'div',
    {},
    (open.length > 0 || isRunning) &&
      h(
        'p',
        { class: 'list-actions' },
        open.length > 0 &&
          action(
            open.length === reachable.length ? 'Work all out' : 'Work the others out',
            'limiting spans of this deck',
            'reach.all',
            () => desk.ask(open),
          ),
        open.length > 0 && isRunning && ' ',
        isRunning && action('Leave off', 'limiting spans of this deck', 'reach.leave', desk.leaveOff),
      ),
    pushed(
      'Limiting spans of this deck',
      h(
        'table',
        { class: 'figures reaches' },
        h('caption', {}, 'Limiting spans of this deck'),
        h(
          'thead',
          {},
          h(
            'tr',
            {},
            head.map((words) => h('th', { scope: 'col' }, words)),
          ),
        ),
        h(
          'tbody',
          {},
          reachable.map((form) =>
            h(
              'tr',
              {},
              h('th', { scope: 'row' }, formLooks[form].short),
              h('td', {}, length(spanWindow(form).possible[1])),
              stateCells(desk, form, forms.get(form)).map((cell, i) =>
                h('td', { class: i === 1 ? 'text' : null }, cell),
              ),
            ),
          ),
        ),
      ),
    ),
  );
}
