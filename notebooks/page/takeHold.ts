import { h } from '../html.ts';
import { draggable, type DragAt } from './dragging.ts';
import { readFigure } from './figureText.ts';
import { screenFrames } from './frames.ts';

/** What the handles of a drawing do; keys are those of the handles. */
export interface HandDesk {
  /** Something is taken hold of at a value. */
  readonly take: (key: string, value: number) => void;
  /** It is moved: one step of undo until it is let go. */
  readonly move: (key: string, value: number) => void;
  /** A value was typed; says why it cannot be had, or null. */
  readonly type: (key: string, value: number) => string | null;
  /** What was moved stays. */
  readonly letGo: () => void;
  /** Back to where it was taken. */
  readonly back: () => void;
  /** The key for locking was pressed on it. */
  readonly lock: (key: string) => void;
  /** One more is wanted in a bay of the drawing, at a value or in its middle; says why it cannot be had, or null. */
  readonly add: (bay: string, value: number | null) => string | null;
  /** A handle is to go; says why it stays, or null. */
  readonly remove: (key: string) => string | null;
  /** A figure was typed as the sum of two; says why it cannot be parted so, or null. */
  readonly part: (key: string, values: readonly [number, number]) => string | null;
}

/** What a handle says of itself in its attributes. */
interface Handle {
  readonly element: SVGElement;
  readonly key: string;
  readonly value: number;
  readonly least: number;
  readonly most: number;
  readonly places: number;
  readonly across: number;
  readonly down: number;
  readonly isTyped: boolean;
  readonly isLocked: boolean;
}

function handleAt(target: EventTarget | null): Handle | null {
  const element = target instanceof Element ? target.closest<SVGElement>('[data-handle]') : null;
  if (element === null) return null;
  const figure = (name: string): number => Number(element.getAttribute(name));
  return {
    element,
    key: element.getAttribute('data-handle')!,
    value: figure('aria-valuenow'),
    least: figure('aria-valuemin'),
    most: figure('aria-valuemax'),
    places: figure('data-places'),
    across: figure('data-across'),
    down: figure('data-down'),
    isTyped: element.classList.contains('typed'),
    isLocked: element.classList.contains('locked'),
  };
}

/** Steps of a handle, m: chainages by the half metre, levels by five centimetres; Shift ten times as much, Alt a fifth. */
const stepOf = ({ places }: Handle, { shift, alt }: { shift: boolean; alt: boolean }): number =>
  (places > 1 ? 0.05 : 0.5) * (shift ? 10 : 1) * (alt ? 0.2 : 1);

/** A pixel of a drawing at 1:1000 is a quarter of a metre: levels move by a quarter of what the pointer does, unless Shift is held. */
const LEVEL_GEAR = 0.25;

const within = (value: number, { least, most }: Handle): number => Math.min(Math.max(value, least), most);

/** On a round figure: multiples of the step count from nought. */
const rounded = (value: number, step: number): number => Number((Math.round(value / step) * step).toFixed(3));

const stepKeys: Readonly<Record<string, number>> = {
  ArrowUp: 1,
  ArrowRight: 1,
  ArrowDown: -1,
  ArrowLeft: -1,
  PageUp: 10,
  PageDown: -10,
};

/**
 * Makes the handles of the drawings in a part of the page answer: dragged with mouse, pen or finger, stepped with the arrow keys,
 * typed after Enter or a digit. Escape takes back, L locks, Delete or a double click takes a handle away, plus or a double
 * click between handles puts one there, two lengths typed as a sum part a span. The handles may be drawn anew at any time; `root` stays.
 * @returns where refusals are said, to be put into the page
 */
export function takeHold(root: Element, desk: HandDesk): HTMLElement {
  const said = h('p', { class: 'refusal hand-said', role: 'status' });
  const say = (words: string): void => void (said.textContent = words);
  /** The go of the arrow keys: what is stepped, and where it has come to before the drawing has followed. */
  let stepped: { readonly key: string; value: number } | null = null;
  let dragged: Handle | null = null;
  /** Where the present gear of the drag began. */
  let anchor = { value: 0, dx: 0, dy: 0, isCoarse: false };

  /** Where a pointer that has come so far brings what is dragged. */
  const movedTo = ({ across, down }: Handle, { dx, dy }: DragAt): number =>
    anchor.value + (dx - anchor.dx) * across + (dy - anchor.dy) * down * (anchor.isCoarse ? 1 : LEVEL_GEAR);
  const draggedTo = (handle: Handle, at: DragAt): number =>
    within(rounded(movedTo(handle, at), stepOf(handle, { shift: false, alt: at.alt })), handle);

  /** A handle as it is drawn stands where the last answer had it: it is put so much further, but not its old place. */
  const putAt = (key: string, value: number | null): void => {
    const element = root.querySelector(`[data-handle="${CSS.escape(key)}"]`);
    const handle = handleAt(element);
    if (handle === null) return;
    const px = (perPx: number): number =>
      value === null || perPx === 0 ? 0 : Math.round(((value - handle.value) / perPx) * 10) / 10;
    const [x, y] = [px(handle.across), px(handle.down)];
    for (const part of handle.element.querySelectorAll(':scope > :not(.before)')) {
      if (x === 0 && y === 0) part.removeAttribute('transform');
      else part.setAttribute('transform', `translate(${String(x)} ${String(y)})`);
    }
  };

  /** What was dragged stands where it is drawn, once that has been done. */
  const putBack = (key: string): void => screenFrames.ending(() => putAt(key, null));

  const endSteps = (): void => {
    if (stepped === null) return;
    stepped = null;
    desk.letGo();
  };

  const sayWhy = ({ element }: Handle, why: string | null): void =>
    say(why === null ? '' : `${element.getAttribute('aria-label') ?? ''}: refused, ${why}.`);

  const isHeldFast = ({ isLocked }: Handle): boolean => {
    say(isLocked ? 'Locked: press L to free it.' : '');
    return isLocked;
  };

  const openText = (handle: Handle, first: string | null): void => {
    endSteps();
    const grip = handle.element.querySelector('.grip')!;
    const at = (name: string): number => Number(grip.getAttribute(name));
    const [x, y] = [at('x') + at('width') / 2, at('y') + at('height') / 2];
    const space = 'http://www.w3.org/2000/svg';
    const place = document.createElementNS(space, 'foreignObject');
    for (const [name, value] of Object.entries({ x: x - 40, y: y - 12, width: 80, height: 24 }))
      place.setAttribute(name, String(value));
    const was = handle.value.toFixed(handle.places);
    const box = h('input', {
      class: 'typed-in',
      inputmode: 'decimal',
      'aria-label': handle.element.getAttribute('aria-label'),
      value: first ?? was,
    });
    let isOpen = true;
    const close = (hasFocus: boolean): void => {
      if (!isOpen) return;
      isOpen = false;
      place.remove();
      handle.element.classList.remove('held');
      if (hasFocus) handle.element.focus();
    };
    const figureIn = (text: string): number | string => {
      const read = readFigure(text, { places: handle.places, unit: 'm' });
      return !read.ok ? read.why : read.value === 'unknown' ? 'a figure is needed' : read.value;
    };
    /** Why what was typed cannot be had, or null where it was done. */
    const done = (): string | null => {
      const [first = '', second, ...more] = box.value.split('+');
      const value = figureIn(first);
      if (typeof value === 'string') return value;
      if (second === undefined) return desk.type(handle.key, value);
      const other = figureIn(second);
      if (typeof other === 'string') return other;
      return more.length > 0
        ? 'one pier at a time: two lengths are needed'
        : desk.part(handle.key, [value, other]);
    };
    const keep = (hasFocus: boolean): void => {
      if (!isOpen) return;
      if (box.value.trim() === was) return close(hasFocus);
      const why = done();
      const name = handle.element.getAttribute('aria-label') ?? '';
      say(why === null ? '' : `${name}: refused, ${why}. ${was} is kept.`);
      close(hasFocus);
    };
    box.addEventListener('keydown', (event) => {
      event.stopPropagation();
      if (event.key === 'Enter') keep(true);
      else if (event.key === 'Escape') close(true);
      else return;
      event.preventDefault();
    });
    box.addEventListener('blur', () => keep(false));
    // What is under it is neither chosen nor asked nor dragged.
    for (const type of ['click', 'pointerdown', 'focusout'])
      box.addEventListener(type, (event) => event.stopPropagation());
    place.append(box);
    handle.element.append(place);
    handle.element.classList.add('held');
    box.focus();
    if (first === null) box.select();
    // Else the caret would stand before the digit that opened it.
    else box.setSelectionRange(first.length, first.length);
  };

  draggable(root, {
    byFinger: true,
    may(event) {
      dragged = handleAt(event.target);
      if (dragged === null) return false;
      endSteps();
      event.preventDefault();
      return true;
    },
    start() {
      if (dragged === null || dragged.isTyped || isHeldFast(dragged)) return;
      dragged.element.focus({ preventScroll: true });
      dragged.element.classList.add('held');
      anchor = { value: dragged.value, dx: 0, dy: 0, isCoarse: false };
      desk.take(dragged.key, dragged.value);
    },
    move(at) {
      if (dragged === null || dragged.isTyped || dragged.isLocked) return;
      const { dx, dy, shift } = at;
      if (shift !== anchor.isCoarse) anchor = { value: movedTo(dragged, at), dx, dy, isCoarse: shift };
      desk.move(dragged.key, draggedTo(dragged, at));
    },
    follow(at) {
      if (dragged === null || dragged.isTyped || dragged.isLocked) return;
      putAt(dragged.key, draggedTo(dragged, at));
    },
    end() {
      if (dragged === null || dragged.isTyped || dragged.isLocked) return;
      dragged.element.classList.remove('held');
      desk.letGo();
      putBack(dragged.key);
    },
    cancel() {
      if (dragged === null || dragged.isTyped || dragged.isLocked) return;
      dragged.element.classList.remove('held');
      desk.back();
      putBack(dragged.key);
    },
    tap() {
      if (dragged === null) return;
      if (dragged.isTyped) openText(dragged, null);
      else dragged.element.focus({ preventScroll: true });
    },
  });

  root.addEventListener('keydown', (event) => {
    const pressed = event as KeyboardEvent;
    const { key, shiftKey, altKey, ctrlKey, metaKey } = pressed;
    const handle = handleAt(event.target);
    if (handle === null || ctrlKey || metaKey) return;
    const direction = stepKeys[key];
    if (direction !== undefined) {
      if (!isHeldFast(handle)) {
        if (stepped?.key !== handle.key) {
          endSteps();
          desk.take(handle.key, handle.value);
          stepped = { key: handle.key, value: handle.value };
        }
        const by = direction * stepOf(handle, { shift: shiftKey, alt: altKey });
        stepped.value = within(Number((stepped.value + by).toFixed(3)), handle);
        desk.move(handle.key, stepped.value);
      }
    } else if (key === 'Escape') {
      if (stepped === null) return;
      stepped = null;
      desk.back();
    } else if (key === 'Enter') {
      if (stepped !== null) endSteps();
      else if (!isHeldFast(handle)) openText(handle, null);
    } else if (/^[0-9]$/u.test(key)) {
      if (!isHeldFast(handle)) openText(handle, key);
    } else if (key === 'l' || key === 'L') {
      endSteps();
      say('');
      desk.lock(handle.key);
    } else if (key === 'Delete' || key === 'Backspace') {
      endSteps();
      sayWhy(handle, desk.remove(handle.key));
    } else if (key === 'Insert' || key === '+') {
      endSteps();
      sayWhy(handle, desk.add(handle.key, null));
    } else return;
    event.preventDefault();
    event.stopPropagation();
  });
  // Twice on a handle takes it away, twice in a bay between handles puts one there.
  root.addEventListener('dblclick', (event) => {
    const { target, clientX, clientY } = event as MouseEvent;
    if (!(target instanceof Element) || target.closest('input, .read-only') !== null) return;
    const handle = handleAt(target);
    if (handle !== null) {
      if (!handle.isTyped) sayWhy(handle, desk.remove(handle.key));
      return;
    }
    for (const bay of root.querySelectorAll('[data-bay]')) {
      const { left, right, top, bottom } = bay.getBoundingClientRect();
      if (clientX < left || clientX > right || clientY < top || clientY > bottom) continue;
      const [fromM, toM] = ['data-from', 'data-to'].map((name) => Number(bay.getAttribute(name))) as [
        number,
        number,
      ];
      const value = fromM + ((clientX - left) / (right - left)) * (toM - fromM);
      const why = desk.add(bay.getAttribute('data-bay')!, rounded(value, 0.5));
      say(why === null ? '' : `Refused: ${why}.`);
      return;
    }
  });
  root.addEventListener('focusout', (event) => {
    if (stepped !== null && handleAt(event.target)?.key === stepped.key) endSteps();
  });
  return said;
}
