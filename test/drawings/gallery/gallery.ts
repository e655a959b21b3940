import '../../../notebooks/style/index.css';
import { crossing } from '../../../notebooks/drawing/crossing.ts';
import { stack } from '../../../notebooks/drawing/stack.ts';
import { h } from '../../../notebooks/html.ts';
import { budget, obstacles, options, site, standing } from '../fixture.ts';

const option = options[1]!;
document.body.append(
  h('div', { id: 'crossing' }, crossing({ site, option, obstacles, widthPx: 980 })),
  h(
    'div',
    { id: 'stack' },
    stack({ site, options, standing, budget, currency: 'EUR', reference: 2, widthPx: 1224 }),
  ),
  h(
    'div',
    { id: 'narrow' },
    stack({ site, options, standing, budget, currency: 'EUR', reference: 2, widthPx: 360, prefix: 'n' }),
  ),
);
