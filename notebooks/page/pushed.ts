import { h, type HtmlChild } from '../html.ts';

/**
 * A part wider than a small screen: pushed sideways by finger, wheel or arrow keys. `label` names it for those who do not see
 * it. How far it has been pushed stands in `data-left`, where it can be read without laying out the page.
 */
export const pushed = (label: string, ...children: HtmlChild[]): HTMLElement => {
  const part = h('div', { class: 'pushed', tabindex: 0, role: 'region', 'aria-label': label }, children);
  part.classList.toggle('with-bar', part.firstElementChild?.classList.contains('ranking') === true);
  part.addEventListener('scroll', () => (part.dataset['left'] = String(part.scrollLeft)), { passive: true });
  return part;
};
