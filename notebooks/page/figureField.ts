import { h } from '../html.ts';
import type { FigureSpec, Origin } from './figureSpec.ts';
import { originWords } from './figureSpec.ts';
import type { Figure } from './figureText.ts';
import { writeFigure } from './figureText.ts';
import { nextId } from './nextId.ts';
import type { RefusalSlot } from './refusal.ts';
import { markRefused, refusalSlot } from './refusal.ts';

/** The elements of a figure in place, and how they are dressed. */
export interface FigureField {
  /** The whole: the figure, what lies below it, and the place of a refusal. */
  readonly element: HTMLElement;
  /** The figure itself, which takes the focus. */
  readonly field: HTMLElement;
  readonly below: HTMLElement;
  readonly refusal: RefusalSlot;
  readonly hasFocus: () => boolean;
  readonly selectAll: () => void;
  /** Writes the value; a figure that holds the focus is selected whole again where that is wanted. */
  readonly write: (shown: Figure, select: boolean) => void;
  /** Underline, and what is told to those who do not see it. */
  readonly dress: (shown: Figure, origin: Origin, isRefused: boolean) => void;
}

/** Builds the elements of a figure; what they do is said in `figureInput`. */
export function figureField(spec: FigureSpec): FigureField {
  const { label, unit, unknown, isSaid = false, step = 1 } = spec;
  const description = [
    `Arrow keys step ${step}, with Shift ${step * 10}, with Alt ${step / 10}`,
    'Enter keeps, Escape goes back',
    ...(unknown === undefined ? [] : [`? for ${isSaid ? unknown : 'not known'}`]),
  ];
  const field = h('span', {
    class: 'fig',
    role: 'spinbutton',
    tabindex: 0,
    contenteditable: 'plaintext-only',
    inputmode: 'decimal',
    spellcheck: 'false',
    'aria-label': unit === undefined ? label : `${label}, ${unit}`,
    ...(spec.min && { 'aria-valuemin': spec.min.value }),
    ...(spec.max && { 'aria-valuemax': spec.max.value }),
  });
  const below = h('span', { class: 'below' });
  const refusal = refusalSlot(`${nextId('figure')}-refusal`);
  const element = h('span', { class: 'entry', 'data-key': spec.key ?? label }, field, below, refusal.element);
  const page = element.ownerDocument;
  const hasFocus = (): boolean => page.activeElement === field;
  const selectAll = (): void => page.getSelection()?.selectAllChildren(field);

  return {
    element,
    field,
    below,
    refusal,
    hasFocus,
    selectAll,
    write(shown, select) {
      const words = writeFigure(shown, spec);
      if (field.textContent === words) return;
      field.textContent = words;
      if (select && hasFocus()) selectAll();
    },
    dress(shown, origin, isRefused) {
      const isUnknown = shown === 'unknown' && !isSaid;
      field.className = `fig ${isUnknown ? 'unknown' : origin}${isRefused ? ' refused' : ''}`;
      const stands =
        origin !== 'typed' && spec.confirm !== undefined ? ['left as it is, Enter confirms it'] : [];
      field.setAttribute('aria-description', [...originWords[origin], ...stands, ...description].join('; '));
      if (shown === 'unknown') field.removeAttribute('aria-valuenow');
      else field.setAttribute('aria-valuenow', String(shown));
      const words = writeFigure(shown, spec);
      const spoken = unit === undefined || shown === 'unknown' ? words : `${words} ${unit}`;
      field.setAttribute('aria-valuetext', spoken);
      markRefused(field, isRefused ? refusal : null);
    },
  };
}
