import example from '../../data/examples/low-ferry.json';
import { readStudy, writeStudy } from '../../lib/index.ts';
import { h, type HtmlChild } from '../html.ts';
import { deviceCupboard, savedWords, sheet, studyShelf, type StudyEntry } from '../page/index.ts';
import { graph as newGraph } from '../reactive/index.ts';

/** Studies kept on this device, newest first; empty where the browser keeps nothing. */
async function studies(): Promise<readonly StudyEntry[]> {
  const cupboard = await deviceCupboard().catch(() => null);
  return cupboard ? studyShelf(cupboard, { readStudy, writeStudy }, () => new Date()).list() : [];
}

function studyTable(rows: readonly StudyEntry[]): HtmlChild {
  if (rows.length === 0)
    return h(
      'p',
      { class: 'prose' },
      'No study has been saved on this device yet. A worked example becomes yours with the first change.',
    );
  return h(
    'table',
    {},
    h(
      'thead',
      {},
      h(
        'tr',
        {},
        ['study', 'reference', 'saved'].map((word) => h('th', { scope: 'col' }, word)),
      ),
    ),
    h(
      'tbody',
      {},
      rows.map(({ id, title, reference, savedAt }) =>
        h(
          'tr',
          {},
          h(
            'th',
            { scope: 'row' },
            h('a', { href: `./option-study.html?study=${encodeURIComponent(id)}` }, title),
          ),
          h('td', { class: 'text' }, reference),
          h('td', { class: 'text' }, `${savedAt.slice(0, 10)}, ${savedWords(savedAt)}`),
        ),
      ),
    ),
  );
}

const graph = newGraph();
const kept = graph.slow('studies', {}, studies, { policy: 'latest' });
const page = sheet(graph);
page.mount(document.body, {
  bar: {
    pages: [
      { words: 'Spanledger', href: './index.html', here: true },
      { words: 'Option study', href: './option-study.html' },
    ],
  },
  head: {
    title: 'Shelf',
    answer:
      'A notebook for option studies of bridges: from a crossing and a budget to ranked forms, spans, depths, quantities and cost with honest ranges, and the reasons.',
    next: h('a', { href: './option-study.html' }, 'open the worked example'),
  },
  sections: [
    page.section(1, 'Studies', 'On this device only; nothing leaves it.', [
      page.cell({
        station: '1+010',
        title: 'Studies on this device',
        shows: { kept },
        owns: [kept],
        body: (v) => studyTable(v.kept),
        notes: [
          h(
            'p',
            {},
            'Saved as you type. A study can be saved as a file from its page and opened there again.',
          ),
        ],
      }),
    ]),
    page.section(2, 'Worked example', 'Invented, and says so.', [
      page.cell({
        station: '2+010',
        title: 'Worked example',
        shows: {},
        body: h(
          'div',
          { class: 'prose' },
          h('p', {}, h('a', { href: './option-study.html' }, example.title)),
          h('p', {}, example.notice),
        ),
      }),
    ]),
    page.section(3, 'Cautions', null, [
      page.cell({
        station: '3+010',
        title: 'Cautions',
        shows: {},
        body: h(
          'p',
          { class: 'caution prose' },
          h('b', {}, 'Option stage only; not a design and not for construction.'),
          ' Sizes are quick checks, not code verification. Temporary works and stability during erection need their own design. Ground, flood, scour, vessel impact and seismic matters need specialists. Clearances and loads are presets to be confirmed with the authority. A licensed engineer and the local codes decide. All rates shipped with the tool are invented.',
        ),
      }),
    ]),
  ],
});
