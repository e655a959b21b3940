import { ratesFor, startValueWords, type Obstacle, type Study } from '../../../lib/index.ts';
import { h } from '../../html.ts';
import { standing, type StudyStore } from '../../page/index.ts';
import type { Graph } from '../../reactive/index.ts';
import { envelopeSentence, lineSentence, supportsSentence, windowsSentence } from './crossingSentences.ts';
import { sayIn } from './fieldTable.ts';
import { inWords } from './inWords.ts';
import { budgetAmount, planShapeOf, provedOf } from './madeFields.ts';
import { accessSentence, budgetSentence, demandsSentence, groundSentence } from './meansSentences.ts';
import { problemBeside } from './problemBeside.ts';
import { approachSentence, roadSentence, roadShape, waterSentence } from './roadSentences.ts';

/** The stretch whose width decides the main opening: the widest that bars supports; -1 where none does. */
function widestBarred(obstacles: readonly Obstacle[]): number {
  const widths = obstacles.map(({ supports, fromM, toM }) => (supports === 'hard' ? toM - fromM : -1));
  const widest = Math.max(...widths);
  return widest > 0 ? widths.indexOf(widest) : -1;
}

/** Keeps a comma, stop or sign on the line of the figure before it, where lines are broken. */
function glued(paragraph: HTMLElement): HTMLElement {
  for (const field of Array.from(paragraph.querySelectorAll(':scope > .entry'))) {
    const next = field.nextSibling;
    const mark = /^[.,;:°]/u.exec(next?.nodeValue ?? '');
    if (next === null || mark === null) continue;
    next.nodeValue = (next.nodeValue ?? '').slice(1);
    const glue = h('span', { class: 'glue' });
    field.replaceWith(glue);
    glue.append(field, mark[0]);
  }
  return paragraph;
}

/** What the words of the sentences hang on besides the figures in them. */
function shape(study: Study): unknown {
  const { brief, books } = study;
  return [
    brief.deck.map(({ kind }) => kind),
    planShapeOf(brief.crossing),
    brief.obstacles.map(({ kind, name, supports, clearance }) => [kind, name, supports, clearance !== null]),
    widestBarred(brief.obstacles),
    brief.waters.map(({ name, floodLevelM }) => [name, floodLevelM === 'unknown']),
    brief.road.fixedEnd,
    roadShape(brief.road),
    provedOf(study),
    brief.budget === 'unknown',
    books.currency,
  ];
}

/** The brief in prose, with every figure, choice and name to be changed where it stands. */
export function briefSentences(graph: Graph, store: StudyStore): HTMLElement {
  // One for the life of the page: it remembers what a budget said before it became unknown.
  const amount = budgetAmount(ratesFor(store.valid().books).pack.priceDate);
  return standing(graph, store, {
    say: problemBeside,
    shape,
    build(study, fields) {
      const words = inWords(fields);
      const { obstacles, waters } = study.brief;
      const main = widestBarred(obstacles);
      const paragraphs = [
        [
          lineSentence(words, study),
          windowsSentence(words, study),
          obstacles.map((obstacle, index) => [
            supportsSentence(words, obstacle, index, index === main),
            envelopeSentence(words, store, obstacle, index),
          ]),
        ],
        [
          waters.map((_, index) => waterSentence(words, study, index)),
          roadSentence(words, study),
          approachSentence(words, study),
        ],
        [
          groundSentence(words, study),
          accessSentence(words),
          demandsSentence(words),
          budgetSentence(words, study, amount),
        ],
      ];
      const unconfirmed = h('p', { class: 'small unconfirmed', role: 'status' });
      fields.follow([], (draft) => {
        const found = startValueWords(draft);
        sayIn(unconfirmed, found === '' ? '' : `${found}.`);
      });
      return [
        h(
          'div',
          { class: 'prose' },
          paragraphs.map((sentences) => glued(h('p', {}, sentences))),
        ),
        unconfirmed,
      ];
    },
  }).element;
}
