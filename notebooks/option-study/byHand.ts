import type { AppraisedOption, KeptOption } from '../../lib/index.ts';
import { supportName } from '../drawing/alongOption.ts';
import { optionTitle } from '../drawing/optionWords.ts';
import { level, listed } from '../format.ts';
import { h, type HtmlChild } from '../html.ts';
import type { StudyStore } from '../page/index.ts';
import { askedWords } from './choiceEdits.ts';
import { released, withDepth, withLock, withVariant } from './handEdits.ts';

/** How an option that follows the search is taken in hand; paper need not say it. */
const TAKE_HOLD =
  ' Take hold of it in the stack: drag a pier, its soffit or an abutment that the brief leaves a window, or click a span and type; a double click between two piers adds one, a double click on a pier removes it. It then keeps your figures under its number.';

const action = (words: string, key: string, act: () => void, name = words): HTMLElement =>
  h(
    'button',
    { type: 'button', class: 'action list', 'data-key': key, 'aria-label': name, onclick: act },
    words,
  );

/** Whether the reference follows the search or is kept by hand, and what can be done about it. */
export function byHand(
  option: AppraisedOption | null,
  kept: KeptOption | undefined,
  store: StudyStore,
): HtmlChild {
  if (option === null) {
    return h(
      'p',
      { class: 'prose' },
      'No option is in hand.',
      kept !== undefined && [' ', giveBack(kept, store)],
    );
  }
  const inner = option.supports.length - 2;
  const name = `Option ${option.number} (${optionTitle(option)})`;
  const locks = Array.from({ length: Math.max(0, inner) }, (_, i) => {
    const index = i + 1;
    const isLocked = kept?.locked?.includes(index) === true;
    const word = `${isLocked ? 'Unlock' : 'Lock'} ${supportName(index, inner + 2)}`;
    const what = `${isLocked ? 'unlocking' : 'locking'} a pier`;
    return action(word, `lock.${index}`, () =>
      store.edit((study) => withLock(study, option, index, !isLocked), { what }),
    );
  });
  const said: HtmlChild =
    kept === undefined
      ? [
          `${name}, the reference, stands as the search proposed it.`,
          h('span', { class: 'on-screen' }, TAKE_HOLD),
        ]
      : kept.depthM === null
        ? `${name}, the reference, is kept by hand: its supports stay where you put them, its depth is that of least cost.`
        : `${name}, the reference, is kept by hand: its supports stay where you put them, and its depth of ${level(kept.depthM)} m.`;
  const asked = kept === undefined ? [] : askedWords(kept);
  return [
    h('p', { class: 'prose' }, said, asked.length > 0 && ` Asked of it: ${listed(asked)}.`),
    h('p', { class: 'list-actions' }, [
      kept !== undefined && giveBack(kept, store),
      kept !== undefined &&
        kept.depthM !== null &&
        action('Depth of least cost', 'depth.free', () =>
          store.edit((study) => withDepth(study, option, null), { what: 'freeing the depth' }),
        ),
      kept?.variant !== undefined &&
        action('Back to what the form finds', 'made.free', () =>
          store.edit((study) => withVariant(study, option, null), { what: 'giving back how it is made' }),
        ),
      locks,
    ]),
  ];
}

const giveBack = ({ number }: KeptOption, store: StudyStore): HTMLElement =>
  action('Give it back to the search', 'give.back', () =>
    store.edit((study) => released(study, number), { what: `giving option ${number} back` }),
  );
