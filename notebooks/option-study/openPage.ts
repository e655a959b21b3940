import {
  choiceProblems,
  readDraft,
  readStudy,
  sentence,
  standardNames,
  writeStudy,
  type Appraisal,
  type Problem,
  type Study,
} from '../../lib/index.ts';
import { exampleNamed } from '../exampleNames.ts';
import { workedExample } from '../examples.ts';
import { h } from '../html.ts';
import {
  dayOf,
  deviceCupboard,
  fieldsOf,
  fileName,
  isOf,
  journal,
  keeping,
  openFile,
  pagesFrom,
  printUpright,
  readOnly,
  readTyped,
  saveFile,
  savedWords,
  sheet,
  studyShelf,
  studyStore,
  undoKeys,
  whileDragged,
  type Journal,
  type Keeping,
  type StudyFormat,
  type StudyShelf,
  type TypedStudy,
} from '../page/index.ts';
import { graph as newGraph } from '../reactive/index.ts';
import { answeredFirst } from '../worked/answeredFirst.ts';
import { readAnswer } from '../worked/answerText.ts';
import { appraiser } from '../worker/index.ts';
import { arrangementSection } from './arrangementSection.ts';
import { problemBeside } from './brief/problemBeside.ts';
import { briefSection } from './briefSection.ts';
import { costSection } from './costSection.ts';
import { decisionSection } from './decision/decisionSection.ts';
import { depthSection } from './depthSection.ts';
import { heldNote } from './heldNote.ts';
import { openedNote } from './openedNote.ts';
import { typedNotes } from './notes/typedNotes.ts';
import { programmeSection, tradeOffSection } from './programmeSection.ts';
import { quantitySection } from './quantitySection.ts';
import { rankingSection } from './rankingSection.ts';
import { sectionSection } from './sectionSection.ts';
import { spanSection } from './spanSection.ts';
import { studyCells } from './studyCells.ts';
import { studyWhereFrom } from './whereFrom.ts';
import { answerWords, nextWords, partWords, pricesWords } from './words.ts';

/**
 * What is wrong with a study that follows on another; nothing when it is valid. Read back from its own text, as a file would
 * be; what is newly asked of an option must be something its form can be.
 */
function check(study: Study, before: Study): readonly Problem[] {
  const read = readStudy(writeStudy(study));
  return read.ok ? choiceProblems(study, before) : read.problems;
}

const format: StudyFormat = { readStudy, readDraft, writeStudy };

const query = new URLSearchParams(location.search);

/** A study as a page begins with it. */
interface Opened extends TypedStudy {
  readonly id: string;
  readonly revision: number;
  readonly problem: string;
  /** What was changed last time had not been saved when the page was closed. */
  readonly isUnsaved: boolean;
}

/** The study named in the address with what had not been saved of it, or a worked example under an id of its own. */
async function opened(shelf: StudyShelf | null, waiting: Journal): Promise<Opened> {
  const id = query.get('study');
  const study = workedExample(exampleNamed(query.get('example')));
  const anew = { id: crypto.randomUUID(), study, draft: null, revision: 0, problem: '', isUnsaved: false };
  if (id === null || shelf === null) return { ...anew, ...(id !== null && { id }) };
  const loaded = await shelf.load(id);
  const unsaved = waiting.get(id);
  const revision = loaded.ok ? loaded.value.revision : 0;
  if (unsaved !== undefined && isOf(unsaved, revision)) {
    const read = readTyped(format, unsaved);
    if (read.ok) return { ...anew, id, ...read.value, revision, isUnsaved: true };
  }
  if (loaded.ok) return { ...anew, id, ...loaded.value };
  return {
    ...anew,
    problem: `The study asked for was not opened: ${loaded.problems.map(sentence).join(' ')} A worked example is shown instead.`,
  };
}

/**
 * Opens the page.
 * @param coming text of the answer to the worked example that is asked for; null where a study is
 */
export async function openPage(coming: Promise<string | null> | null): Promise<void> {
  // Without an answer they load while the page looks for its study.
  const workers =
    coming === null
      ? appraiser()
      : answeredFirst(
          appraiser,
          coming.then((text) => (text === null ? null : readAnswer(text))),
        );
  // The hand has both processors to itself.
  whileDragged(workers.hold);
  const cupboard = await deviceCupboard().catch(() => null);
  const shelf = cupboard && studyShelf(cupboard, format, () => new Date());
  const unsaved = journal(localStorage);
  const { study, draft, problem, id, revision, isUnsaved } = await opened(shelf, unsaved);
  let kept: Keeping | null = null;

  const graph = newGraph();
  const store = studyStore(graph, study, check, () => kept?.mayChange() ?? true);
  if (draft !== null) store.open(study, draft);
  const cells = studyCells(graph, store, workers);
  const today = (): string => dayOf(new Date());
  const page = sheet(graph, {
    aside: [cells.byDepth, cells.spanning],
    held: store.held,
    beside: typedNotes({ graph, store, appraisal: cells.appraisal, today }),
  });

  const saved = h('span', { class: 'state', role: 'status' }, problem);
  /** Said of a study that was opened from a file until it is changed. */
  const fromFile = h('p', { class: 'opened', role: 'status' });
  const button = (words: string, act: () => void): HTMLElement =>
    h('button', { type: 'button', class: 'action', onclick: act }, words);
  /** A study with the numbers that its options have been given meanwhile. */
  const numbered = (one: Study): Study => ({
    ...one,
    options: { ...one.options, register: cells.register() },
  });
  const typed = (): TypedStudy => {
    const state = graph.state(store.draft);
    const valid = store.valid();
    const isFaulty = state.state === 'ready' && state.value !== valid;
    return { study: numbered(valid), draft: isFaulty ? numbered(state.value) : null };
  };
  /** A file is for others: it holds the last valid study, and says so where that is not the one on the page. */
  const saveAsFile = (): void => {
    const { study: whole, draft: faulty } = typed();
    saveFile(fileName(whole), writeStudy(whole));
    if (faulty !== null)
      saved.textContent =
        'The file holds the study as it was before the entry that is refused: nothing typed since is in it. Mend that entry and save the file again.';
  };
  const openStudy = async (): Promise<void> => {
    const text = await openFile();
    if (text === null) return;
    const read = readStudy(text);
    if (!read.ok) {
      saved.textContent = `Not opened, the study on the page is kept. ${read.problems.map(sentence).join(' ')}`;
      return;
    }
    // Where nothing is kept the study on the page is not lost either: it stands one step of undo away.
    if (kept === null) {
      store.edit(() => read.value, { what: `opening ${read.value.title}` });
      return;
    }
    // A study from a file is another study: it never takes the place of the one that was on the page.
    const earlier = { id: kept.id(), title: store.valid().title };
    const before = await kept.startAnew(crypto.randomUUID());
    if (before === 'not saved') {
      saved.prepend('Not opened, because what was changed on the page is not saved. ');
      return;
    }
    fromFile.replaceChildren(...h('span', {}, openedNote(before === 'kept' ? earlier : null)).childNodes);
    store.open(read.value);
  };
  const undo = button('Undo', store.undo);
  const redo = button('Redo', store.redo);
  graph.watch(store.history, (state) => {
    if (state.state !== 'ready') return;
    if (state.value.undo !== null) fromFile.replaceChildren();
    for (const [element, word, what] of [
      [undo, 'Undo', state.value.undo],
      [redo, 'Redo', state.value.redo],
    ] as const) {
      element.toggleAttribute('disabled', what === null);
      element.title = what === null ? `Nothing to ${word.toLowerCase()}` : `${word} ${what}`;
    }
  });
  undoKeys(store);

  const appraised = (): Appraisal | null => {
    const state = graph.state(cells.appraisal);
    return 'value' in state ? state.value : null;
  };
  const { head, brief, books } = store.slices;
  const { words } = fieldsOf(graph, store, problemBeside);
  const element = page.mount(document.body, {
    bar: {
      pages: pagesFrom('option-study'),
      tools: [
        saved,
        undo,
        redo,
        button('Open', () => void openStudy()),
        button('Save as file', saveAsFile),
        button('Print', () => print()),
        button('Print upright', printUpright),
        fromFile,
      ],
    },
    head: {
      title: words(['title'], { label: 'title of the study', most: 500 }),
      answer: [
        page.live({ problems: store.problems }, (v) => heldNote(v.problems.length)),
        // A worked example comes with its answer; a study of one's own takes some seconds.
        page.live(
          { appraisal: cells.appraisal },
          (v) => answerWords(v.appraisal),
          coming === null
            ? 'The options are being worked out. The brief can be changed meanwhile.'
            : undefined,
        ),
      ],
      next: page.live({ brief }, (v) => nextWords(v.brief)),
      block: [
        ['Study', words(['reference'], { label: 'reference of the study', most: 60 })],
        ['Prices', page.live({ brief, books }, (v) => `${pricesWords(v)}, demo rates`)],
        ['Loading', page.live({ brief }, (v) => standardNames[v.brief.loading])],
        ['Levels', 'm above local datum'],
        ['Stage', 'option study; not for construction'],
        [
          'Fingerprint',
          page.live({ appraisal: cells.appraisal }, (v) => v.appraisal.study.fingerprint.slice(0, 12)),
        ],
      ],
    },
    foot: () => {
      const fingerprint = appraised()?.study.fingerprint.slice(0, 12) ?? '';
      return [store.valid().reference, fingerprint, `prices ${pricesWords(store.valid())}, demo rates`];
    },
    unfinished: () => {
      const appraisal = appraised();
      return appraisal === null ? '' : partWords(appraisal);
    },
    sections: [
      briefSection(page, graph, store, cells),
      spanSection(page, store, cells),
      arrangementSection(page, graph, store, cells),
      depthSection(page, cells),
      sectionSection(page, cells),
      quantitySection(page, cells),
      costSection(page, graph, store, cells),
      programmeSection(page, cells),
      tradeOffSection(page, cells),
      rankingSection(page, graph, store, cells),
      decisionSection(page, graph, store, cells, today),
    ],
  });
  studyWhereFrom(graph, cells, element);
  graph.watch(head, (state) => {
    if (state.state === 'ready') document.title = `${state.value.title} · Spanledger`;
  });

  const setReadOnly = readOnly(element);
  let addressed: string | null = null;
  /** Puts the study into the address, where it is not there yet: telling the browser takes longer than a drawing. */
  const address = (): void => {
    if (kept === null || kept.id() === addressed) return;
    addressed = kept.id();
    history.replaceState(null, '', `?study=${encodeURIComponent(addressed)}`);
  };
  if (shelf !== null) {
    kept = keeping({
      id,
      revision,
      shelf,
      journal: unsaved,
      format,
      locks: navigator.locks,
      study: typed,
      show: (shown) => store.open(shown.study, shown.draft ?? undefined),
      saved: (savedAt, isFaulty) => (saved.textContent = savedWords(savedAt, isFaulty)),
      refused: (problems) => (saved.textContent = problems.map(sentence).join(' ')),
      owned(isMine) {
        setReadOnly(!isMine);
        if (isMine) saved.replaceChildren(problem);
        else
          saved.replaceChildren(
            'Read only: another tab has this study open. ',
            button('Work on it here', () => kept?.takeOver()),
          );
      },
    });
    if (isUnsaved) kept.changed();
  }
  let first = true;
  graph.watch(store.draft, (state) => {
    if (state.state !== 'ready') return;
    // Opening a study changes nothing; only an edit is saved.
    if (first) {
      first = false;
      return;
    }
    kept?.changed();
    address();
  });
}
