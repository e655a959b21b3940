import { powers } from '../format.ts';
import { h } from '../html.ts';
import type { LineSection, Sheet } from '../page/index.ts';
import { knownWords, references } from './references.ts';

/** Section 5: every work the page cites, and how it is known. */
export function sourceSection(page: Sheet): LineSection {
  const read = references.filter(({ work }) => knownWords(work) === 'read').length;
  const finding = `${read} of ${references.length} were read; the others are from memory or common practice.`;
  return page.section(5, 'Sources', finding, [
    page.cell({
      station: '5+010',
      title: 'Sources',
      shows: {},
      wide: true,
      long: true,
      body: h(
        'ol',
        { class: 'sources' },
        references.map(({ work }) =>
          h(
            'li',
            { class: knownWords(work) === 'read' ? 'read' : 'remembered' },
            powers(work.text),
            ' ',
            h(
              'span',
              { class: 'known' },
              `(${knownWords(work)}${work.note === undefined ? '' : `. ${work.note.replace(/\.$/u, '')}`})`,
            ),
          ),
        ),
      ),
    }),
  ]);
}
