import { builtSpans, depthGuidance, formIds, source, spanSources, type Source } from '../../lib/index.ts';
import type { ReferenceMark } from '../charts/referenceMarks.ts';

/** A work of the list of sources. */
export interface Reference extends ReferenceMark {
  readonly work: Source;
}

/** Ids of all works the page cites, in the order in which its charts first name them. */
const cited = [
  ...new Set(
    formIds.flatMap((form) => [
      ...spanSources(form).map((span) => span.source),
      ...[{}, { lengthM: 1000 }].flatMap((room) =>
        depthGuidance(form, { spanM: 100, ...room }).flatMap(({ sources }) => sources),
      ),
      ...[builtSpans(form)?.source ?? []].flat(),
    ]),
  ),
];

/** The list of sources of the page, numbered from 1. */
export const references: readonly Reference[] = cited.map((id, index) => {
  const work = source(id);
  return { number: index + 1, read: work.read, work };
});

const byId = new Map(references.map((reference) => [reference.work.id, reference]));

/** The mark of a work in a chart. @throws RangeError for a work the page does not list */
export function referenceTo(id: string): ReferenceMark {
  const found = byId.get(id);
  if (found === undefined)
    throw new RangeError(`source ${id}: expected one of the list of the page; add it to \`cited\``);
  return { number: found.number, read: found.read };
}

/** How a work is known: 'read', 'from memory', 'common practice, no source', 'worked out here'. */
export const knownWords = ({ read, origin }: Source): string =>
  origin === 'practice'
    ? 'no source'
    : origin === 'derived'
      ? 'worked out here'
      : read
        ? 'read'
        : 'from memory';
