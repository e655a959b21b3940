import example from '../../data/examples/low-ferry.json';
import { parseStudy, readStudy, sentence, writeStudy, type Problem, type Study } from '../../lib/index.ts';
import { h } from '../html.ts';
import {
  deviceCupboard,
  fileName,
  openFile,
  pagesFrom,
  saveFile,
  savedWords,
  sheet,
  studyShelf,
  studyStore,
  undoKeys,
  type StudyShelf,
} from '../page/index.ts';
import { graph as newGraph } from '../reactive/index.ts';
import { appraiser } from '../worker/index.ts';
import { arrangementSection } from './arrangementSection.ts';
import { briefSection } from './briefSection.ts';
import { costSection } from './costSection.ts';
import { depthSection } from './depthSection.ts';
import { programmeSection, tradeOffSection } from './programmeSection.ts';
import { quantitySection } from './quantitySection.ts';
import { rankingSection } from './rankingSection.ts';
import { sectionSection } from './sectionSection.ts';
import { spanSection } from './spanSection.ts';
import { studyCells } from './studyCells.ts';
import { studyWhereFrom } from './whereFrom.ts';
import { answerWords, nextWords, pricesWords } from './words.ts';

/** What is wrong with a study; nothing when it is valid. Read back from its own text, as a file would be. */
function check(study: Study): readonly Problem[] {
  const read = readStudy(writeStudy(study));
  return read.ok ? [] : read.problems;
}

function worked(): Study {
  const parsed = parseStudy(example);
  if (!parsed.ok) throw new Error(parsed.problems.map(sentence).join(' '));
  return parsed.value;
}

/** The study named in the address, or the worked example under its own id. */
async function opened(
  shelf: StudyShelf | null,
): Promise<{ id: string; study: Study; revision: number; problem: string }> {
  const id = new URLSearchParams(location.search).get('study');
  if (id === null || shelf === null)
    return { id: id ?? crypto.randomUUID(), study: worked(), revision: 0, problem: '' };
  const loaded = await shelf.load(id);
  if (loaded.ok) return { id, ...loaded.value, problem: '' };
  return {
    id: crypto.randomUUID(),
    study: worked(),
    revision: 0,
    problem: `The study asked for was not opened: ${loaded.problems.map(sentence).join(' ')} The worked example is shown instead.`,
  };
}

/** Wait after the last change before it is saved, ms. */
const SAVE_AFTER_MS = 600;

async function start(): Promise<void> {
  // They load while the page looks for its study.
  const workers = appraiser();
  const cupboard = await deviceCupboard().catch(() => null);
  const shelf = cupboard && studyShelf(cupboard, { readStudy, writeStudy }, () => new Date());
  const { study, problem, ...place } = await opened(shelf);
  let { id, revision } = place;

  const graph = newGraph();
  const store = studyStore(graph, study, check);
  const cells = studyCells(graph, store, workers);
  const page = sheet(graph);

  const saved = h('span', { class: 'state', role: 'status' }, problem);
  const button = (words: string, act: () => void): HTMLElement =>
    h('button', { type: 'button', class: 'action', onclick: act }, words);
  const whole = (): Study => {
    const valid = store.valid();
    return { ...valid, options: { ...valid.options, register: cells.register() } };
  };
  const openStudy = async (): Promise<void> => {
    const text = await openFile();
    if (text === null) return;
    const read = readStudy(text);
    if (!read.ok) {
      saved.textContent = `Not opened, the study on the page is kept. ${read.problems.map(sentence).join(' ')}`;
      return;
    }
    // A study from a file is another study: it never takes the place of the one that was on the page.
    id = crypto.randomUUID();
    revision = 0;
    store.open(read.value);
  };
  const undo = button('Undo', store.undo);
  const redo = button('Redo', store.redo);
  graph.watch(store.history, (state) => {
    if (state.state !== 'ready') return;
    for (const [element, word, what] of [
      [undo, 'Undo', state.value.undo],
      [redo, 'Redo', state.value.redo],
    ] as const) {
      element.toggleAttribute('disabled', what === null);
      element.title = what === null ? `Nothing to ${word.toLowerCase()}` : `${word} ${what}`;
    }
  });
  undoKeys(store);

  const { head, brief, books } = store.slices;
  const element = page.mount(document.body, {
    bar: {
      pages: pagesFrom('option-study'),
      tools: [
        saved,
        undo,
        redo,
        button('Open', () => void openStudy()),
        button('Save as file', () => saveFile(fileName(whole()), writeStudy(whole()))),
        button('Print', () => print()),
      ],
    },
    head: {
      title: page.live({ head }, (v) => v.head.title),
      answer: page.live({ appraisal: cells.appraisal }, (v) => answerWords(v.appraisal)),
      next: page.live({ brief }, (v) => nextWords(v.brief)),
      block: [
        ['Study', page.live({ head }, (v) => v.head.reference)],
        ['Prices', page.live({ brief, books }, (v) => `${pricesWords(v)}, demo rates`)],
        [
          'Loading',
          page.live({ brief }, (v) => (v.brief.loading === 'lm1' ? 'EN 1991-2, LM1' : 'AASHTO HL-93')),
        ],
        ['Levels', 'm above local datum'],
        ['Stage', 'option study; not for construction'],
        [
          'Fingerprint',
          page.live({ appraisal: cells.appraisal }, (v) => v.appraisal.study.fingerprint.slice(0, 12)),
        ],
      ],
    },
    sections: [
      briefSection(page, graph, store, cells),
      spanSection(page, cells),
      arrangementSection(page, graph, store, cells),
      depthSection(page, cells),
      sectionSection(page, cells),
      quantitySection(page, cells),
      costSection(page, graph, store, cells),
      programmeSection(page, cells),
      tradeOffSection(page, cells),
      rankingSection(page, cells),
    ],
  });
  studyWhereFrom(graph, cells, element);
  document.title = `${study.title} · Spanledger`;

  let timer: ReturnType<typeof setTimeout> | undefined;
  const save = async (): Promise<void> => {
    if (shelf === null) return;
    const result = await shelf.save(id, whole(), revision);
    if (!result.ok) {
      saved.textContent = result.problems.map(sentence).join(' ');
      return;
    }
    revision = result.value.revision;
    saved.textContent = savedWords(result.value.savedAt);
    history.replaceState(null, '', `?study=${encodeURIComponent(id)}`);
  };
  let first = true;
  graph.watch(store.draft, (state) => {
    if (state.state !== 'ready') return;
    // Opening a study changes nothing; only an edit is saved.
    if (first) {
      first = false;
      return;
    }
    clearTimeout(timer);
    timer = setTimeout(() => void save(), SAVE_AFTER_MS);
  });
}

void start();
