import { reachFigure } from '../../lib/index.ts';
import { length } from '../format.ts';
import { h } from '../html.ts';
import { pagesFrom, sheet, whereFrom } from '../page/index.ts';
import { graph as newGraph } from '../reactive/index.ts';
import { reacher } from '../worker/index.ts';
import { answerCells } from './answerCells.ts';
import { builtSection } from './builtSection.ts';
import { depthSection } from './depthSection.ts';
import { disagreementSection } from './disagreementSection.ts';
import { askedSpanM, readQuestion, writeQuestion } from './question.ts';
import { questionSentence } from './questionSentence.ts';
import { reachDesk } from './reachDesk.ts';
import { sourceSection } from './sourceSection.ts';
import { spanSection } from './spanSection.ts';
import { answerWords } from './words.ts';

const { question, problems } = readQuestion(location.search);
const graph = newGraph();
const cells = answerCells(graph, question);
const { asked, answer } = cells;
const desk = reachDesk(graph, asked, reacher());
const page = sheet(graph);

let latest = question;
const sentence = questionSentence({
  question,
  asked: page.live({ asked }, (v) => [h('b', {}, length(askedSpanM(v.asked))), ' m']),
  input(next) {
    latest = next;
    graph.set(asked, next);
  },
  change: () => history.replaceState(null, '', writeQuestion(latest)),
});

const element = page.mount(document.body, {
  bar: {
    pages: pagesFrom('span-chart'),
    tools: [
      h('span', { class: 'state', role: 'status' }, problems.join(' ')),
      h('button', { type: 'button', class: 'action', onclick: () => print() }, 'Print'),
    ],
  },
  head: {
    title: 'Span chart',
    answer: [sentence.element, page.live({ answer }, (v) => answerWords(v.answer))],
    next: [
      'read the depths at ',
      h('a', { href: '#2+010' }, '2+010'),
      '; once ground and levels are known, work the crossing out in an ',
      h('a', { href: './option-study.html' }, 'option study'),
      '.',
    ],
    block: [
      ['Asked', page.live({ asked }, (v) => `${length(askedSpanM(v.asked))} m`)],
      ['Deck', page.live({ asked }, (v) => `${length(v.asked.widthM)} m wide`)],
      [
        'Plan',
        page.live({ asked }, ({ asked: { radiusM } }) =>
          radiusM === 'straight' ? 'straight' : `radius ${length(radiusM)} m`,
        ),
      ],
      ['Stage', 'guidance for a first answer; not a design and not for construction'],
    ],
  },
  sections: [
    spanSection(page, graph, cells, desk),
    depthSection(page, cells),
    disagreementSection(page, graph, cells),
    builtSection(page, cells),
    sourceSection(page),
  ],
});

// Of the figures of this page limiting spans are worked out; the others are published and say their sources beside them.
const where = whereFrom(element, (path) => (path.startsWith('reach/') ? '1+030' : undefined));
graph.watch(desk.limits, (state) => {
  if (state.state !== 'ready') return;
  const { value } = state;
  where.set(value.length === 0 ? null : (path) => reachFigure(value, path), false);
});
