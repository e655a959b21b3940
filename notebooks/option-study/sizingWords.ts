import { formLooks } from '../forms/formLook.ts';
import { h, type HtmlChild } from '../html.ts';
import { depthMissed, type AppraisedOption } from '../model.ts';

/** What sizing has to say of one unit of an option. */
interface Said {
  /** Which unit, where an option has several. */
  readonly unit: string;
  readonly words: readonly string[];
}

/**
 * What sizing has to say of an option beside its checks, unit by unit: what was assumed, what the engineer has to provide,
 * and where a depth asked for could not be made.
 * @param isDepthAsked the depth of the main unit has been asked for
 */
export function sizingSaid(
  { units, designs }: Pick<AppraisedOption, 'units' | 'designs'>,
  isDepthAsked: boolean,
): readonly Said[] {
  return designs.flatMap((design, i) => {
    const { role, form } = units[i]!;
    const missed = role === 'main' && isDepthAsked ? depthMissed(design) : null;
    const words = [...(missed === null ? [] : [missed]), ...design.warnings];
    if (words.length === 0) return [];
    const sameRole = units.filter((unit) => unit.role === role).length > 1;
    const unit =
      units.length === 1
        ? ''
        : `${role === 'main' ? 'Main unit' : 'Approach'}${sameRole ? ` ${i + 1}` : ''}, ${formLooks[form].name}:`;
    return [{ unit, words }];
  });
}

/** The same as lists; one sentence where there is nothing to say. */
export function sizingWords(option: AppraisedOption, isDepthAsked: boolean): HtmlChild {
  const said = sizingSaid(option, isDepthAsked);
  if (said.length === 0) return h('p', { class: 'prose' }, 'Sizing has nothing to add to the checks.');
  return said.map(({ unit, words }) => [
    unit !== '' && h('p', { class: 'prose' }, unit),
    h(
      'ul',
      { class: 'prose' },
      words.map((text) => h('li', {}, text)),
    ),
  ]);
}
