import type { Appraisal, Note, Study } from '../../../lib/index.ts';
import { h, type HtmlChild } from '../../html.ts';
import { dayWords, putAt, standing, type Fields, type StudyStore } from '../../page/index.ts';
import type { Cell, Graph } from '../../reactive/index.ts';
import { focusField } from '../brief/fieldTable.ts';
import { problemBeside } from '../brief/problemBeside.ts';
import { leaveEmptied } from './leaveEmptied.ts';
import { aboutOption, firstNote, optionIn, withNoteText } from './noteEdits.ts';

/** Station of the ranking, where notes on options stand, and those on what this page does not have. */
const OPTIONS_AT = '10+010';

/** Most characters of a note and of a name. */
const MOST = { text: 2000, author: 200 };

/** What notes on a page are typed with. */
export interface NoteDesk {
  readonly graph: Graph;
  readonly store: StudyStore;
  readonly appraisal: Cell<Appraisal>;
  /** The day as a study writes it. */
  readonly today: () => string;
}

/** A note that has been begun and has no words yet. */
interface Begun {
  /** The station where it stands. */
  readonly at: string;
  readonly about: string;
  /** The place it will have among the notes. */
  readonly index: number;
}

/** '2 to 3+020': which note it is, for those who do not see where it stands. */
function nameOf({ notes }: Study, index: number, about: string): string {
  const before = notes.slice(0, index).filter((note) => note.about === about).length;
  return `note ${before === 0 ? '' : `${before + 1} `}to ${about}`;
}

const keyOf = (index: number): string => `notes.${index}.text`;

/**
 * Notes typed against the cells and options of a page, each in the margin of its cell: changed in place, one step of undo a
 * go, and taken out when they are emptied.
 * @returns what stands in the margin of a station
 */
export function typedNotes({
  graph,
  store,
  appraisal,
  today,
}: NoteDesk): (station: string, stations: readonly string[]) => HtmlChild {
  const begun = graph.input<Begun | null>('note begun', null);
  const begunAt = (station: string): Begun | null => {
    const state = graph.state(begun);
    return state.state === 'ready' && state.value?.at === station ? state.value : null;
  };
  const numbers = (): readonly number[] => {
    const state = graph.state(appraisal);
    return 'value' in state
      ? state.value.options.map(({ number }) => number).toSorted((one, other) => one - other)
      : [];
  };
  const begin = (station: string, about: string, within: Element): void => {
    const index = store.valid().notes.length;
    // At once: the hand goes on into the field.
    graph.batch(() => graph.set(begun, { at: station, about, index }));
    focusField(within, keyOf(index));
  };

  const textField = (fields: Fields, index: number, first: Note): HTMLElement =>
    fields.words(
      {
        key: keyOf(index),
        get: (study) => study.notes[index]?.text ?? '',
        put: (study, text) => withNoteText(study, index, first, text, today()),
        owns: [['notes', index]],
      },
      { label: nameOf(store.valid(), index, first.about), most: MOST.text },
    );

  /** The option that a note is about, as a word of its own that can be changed; other notes stand where they belong. */
  const subject = (fields: Fields, index: number, { about }: Note, station: string): HtmlChild => {
    if (about === station) return null;
    const number = optionIn(about);
    if (number === null) return [h('b', {}, about), ': '];
    const known = numbers();
    const choices = (known.includes(number) ? known : [...known, number]).map((one) => ({
      value: aboutOption(one),
      words: String(one),
    }));
    const choice = fields.choice<string>(
      {
        key: `notes.${index}.about`,
        get: (study) => study.notes[index]?.about ?? begunAt(station)?.about ?? about,
        put(study, chosen) {
          if (study.notes[index] !== undefined) return putAt(study, ['notes', index, 'about'], chosen);
          graph.set(begun, { at: station, about: chosen, index });
          return study;
        },
      },
      { label: `option of ${nameOf(store.valid(), index, about)}`, choices },
    );
    return ['Option ', choice, !known.includes(number) && known.length > 0 && ' (not worked out now)', ': '];
  };

  const written = (fields: Fields, index: number, note: Note): HTMLElement =>
    h(
      'span',
      { class: 'by' },
      dayWords(note.date),
      h(
        'span',
        { class: note.author === '' ? 'on-screen' : null },
        ' by ',
        fields.words(['notes', index, 'author'], {
          label: `who wrote ${nameOf(store.valid(), index, note.about)}`,
          most: MOST.author,
        }),
      ),
    );

  /** A note without words goes once the hand has left it. */
  const leave = (paragraph: HTMLElement, station: string): void => {
    paragraph.addEventListener('focusout', () => {
      setTimeout(() => {
        if (paragraph.contains(document.activeElement) || begunAt(station) === null) return;
        graph.set(begun, null);
      });
    });
  };

  return (station, stations) => {
    const isMine = ({ about }: Note): boolean =>
      about === station || (station === OPTIONS_AT && !stations.includes(about));
    const notes = standing(graph, store, {
      say: problemBeside,
      follows: station === OPTIONS_AT ? [begun, appraisal] : [begun],
      shape: (study) => [
        study.notes.map((note) => (isMine(note) ? [note.about, note.date, note.author === ''] : null)),
        begunAt(station),
        station === OPTIONS_AT && numbers(),
      ],
      build(study, fields) {
        const shown = study.notes.map((note, index) =>
          isMine(note)
            ? h(
                'p',
                { class: 'note' },
                subject(fields, index, note, station),
                textField(fields, index, note),
                ' ',
                written(fields, index, note),
              )
            : null,
        );
        const fresh = begunAt(station);
        const index = study.notes.length;
        // Once it has words it is one of the others.
        if (fresh === null || fresh.index !== index) return shown;
        const first = firstNote(study, fresh.about);
        const paragraph = h(
          'p',
          { class: 'note' },
          subject(fields, index, first, station),
          textField(fields, index, first),
        );
        leave(paragraph, station);
        return [shown, paragraph];
      },
    });
    const { element } = notes;
    element.classList.add('typed-notes');
    leaveEmptied(element);
    const action = (words: string, name: string, kind: string, act: () => void): HTMLElement =>
      h('button', { type: 'button', class: `action list ${kind}`, 'aria-label': name, onclick: act }, words);
    return [
      element,
      station === OPTIONS_AT &&
        action('Note on an option', 'Note on an option', 'annotate-option', () => {
          const [first] = numbers();
          const reference = store.valid().options.reference ?? first;
          if (reference !== undefined) begin(station, aboutOption(reference), element);
        }),
      action('Note', `Note to ${station}`, 'annotate', () => begin(station, station, element)),
    ];
  };
}
