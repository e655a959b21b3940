import { h, type HtmlChild } from '../html.ts';

/** A part wider than a small screen: pushed sideways by finger, wheel or arrow keys. `label` names it for those who do not see it. */
export const pushed = (label: string, ...children: HtmlChild[]): HTMLElement =>
  h('div', { class: 'pushed', tabindex: 0, role: 'region', 'aria-label': label }, children);
