import { sentence } from '../../lib/index.ts';
import { scaleBar } from '../drawing/scaleBar.ts';
import { sheet } from '../drawing/sheet.ts';
import { fixed } from '../format.ts';
import { h, type HtmlChild } from '../html.ts';
import { fileName, pushed, saveFile, type StoredStudy } from '../page/index.ts';
import { savedAtWords, type KeptStudy } from './kept.ts';
import { smallCrossing } from './smallCrossing.ts';

/** All studies are drawn at one scale, so that a long crossing looks long. */
const SCALE = 5000;

/** Where a study is opened. */
export const studyHref = (id: string): string => `./option-study.html?study=${encodeURIComponent(id)}`;

export interface StudyListSpec {
  readonly kept: readonly KeptStudy[];
  /** The study taken off last, which can still be put back. */
  readonly removed: StoredStudy | null;
  readonly now: Date;
  readonly widthPx: number;
  readonly duplicate: (study: StoredStudy) => void;
  readonly remove: (study: StoredStudy) => void;
  readonly putBack: (study: StoredStudy) => void;
}

const action = (words: string, label: string, act: () => void): HTMLElement =>
  h('button', { type: 'button', class: 'action', 'aria-label': label, onclick: act }, words);

function row({ stored, read }: KeptStudy, index: number, spec: StudyListSpec): HTMLElement {
  const { id, title, reference, savedAt, text } = stored;
  return h(
    'li',
    { class: 'study' },
    h('span', { class: 'reference' }, reference),
    h(
      'div',
      { class: 'crossing' },
      read.ok
        ? [
            h('a', { class: 'title', href: studyHref(id) }, title),
            h('span', { class: 'long' }, `${fixed(read.site.lengthM, 0)} m`),
            pushed(`What ${title} has to cross`, smallCrossing(read.site, SCALE, `kept-${String(index)}`)),
          ]
        : [
            h('span', { class: 'title' }, title),
            h(
              'p',
              { class: 'failure' },
              `Not opened, and left as it is. ${read.problems.map(sentence).join(' ')}`,
            ),
          ],
    ),
    h('span', { class: 'saved' }, savedAtWords(savedAt, spec.now)),
    h(
      'span',
      { class: 'doings' },
      read.ok && action('Duplicate', `Duplicate ${title}`, () => spec.duplicate(stored)),
      action('Save as file', `Save ${title} as a file`, () => saveFile(fileName(stored), text)),
      action('Remove', `Remove ${title} from this device`, () => spec.remove(stored)),
    ),
  );
}

/** The studies of this device, newest first, each with its crossing at 1:5000, and what can be done with it. */
export function studyList(spec: StudyListSpec): HtmlChild {
  const { kept, removed } = spec;
  return [
    removed !== null &&
      h(
        'p',
        { class: 'removed', role: 'status' },
        `${removed.title} has been removed from this device. `,
        action('Put it back', `Put ${removed.title} back`, () => spec.putBack(removed)),
      ),
    kept.length === 0
      ? h(
          'p',
          { class: 'prose' },
          'No study lies here yet. The sentence above begins one; a worked example becomes yours with the first change to it.',
        )
      : [
          h(
            'ul',
            { class: 'studies' },
            kept.map((one, index) => row(one, index, spec)),
          ),
          sheet(Math.min(spec.widthPx, 640), 40, `Scale bar, 1 to ${String(SCALE)}`, [
            scaleBar(SCALE, 4, 22, { widthPx: Math.min(400, spec.widthPx - 30), rightPx: spec.widthPx }),
          ]),
        ],
  ];
}
