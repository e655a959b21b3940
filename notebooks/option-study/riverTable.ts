import type { Appraisal, AppraisedOption } from '../../lib/index.ts';
import { ofOption } from '../drawing/asked.ts';
import { fixed } from '../format.ts';
import { h } from '../html.ts';

/** A figure of one river of an option, or that it is not known. */
function figureCell(
  option: AppraisedOption,
  path: string,
  value: number | null,
  places: number,
): HTMLElement {
  const words = value === null || !Number.isFinite(value) ? 'not known' : fixed(value, places);
  return h('td', { 'data-figure': ofOption(option, path) }, words);
}

/** What each option does to a river: afflux, freeboard and waterway, or what is not known of them; null without a river. */
export function riverTable({ site, options }: Appraisal): HTMLElement | null {
  const rows = options.flatMap((option) => (option.rivers ?? []).map((river, r) => ({ option, river, r })));
  if (rows.length === 0) return null;
  const heads = ['option', 'water', 'afflux, m', 'freeboard, m', 'waterway, m', 'regime width, m'];
  return h(
    'details',
    { class: 'behind' },
    h('summary', {}, 'What the options do to the water in flood'),
    h(
      'table',
      {},
      h(
        'thead',
        {},
        h(
          'tr',
          {},
          heads.map((word) => h('th', { scope: 'col' }, word)),
        ),
      ),
      h(
        'tbody',
        {},
        rows.map(({ option, river, r }) =>
          h(
            'tr',
            {},
            h('th', { scope: 'row' }, String(option.number)),
            h('td', { class: 'text' }, site.waters[river.water]?.name ?? ''),
            figureCell(option, `rivers/${r}/affluxM`, river.affluxM, 2),
            figureCell(option, `rivers/${r}/freeboardM`, river.freeboardM, 2),
            figureCell(option, `rivers/${r}/waterwayM`, river.waterwayM, 0),
            figureCell(option, `rivers/${r}/regimeWidthM`, river.regimeWidthM, 0),
          ),
        ),
      ),
    ),
  );
}
