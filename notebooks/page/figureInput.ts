import { toDom } from '../drawing/toDom.ts';
import { h } from '../html.ts';
import { draggable } from './dragging.ts';
import { figureField } from './figureField.ts';
import { figureScale, STEP_PX } from './figureScale.ts';
import type { FigureSpec, Origin } from './figureSpec.ts';
import type { Figure } from './figureText.ts';
import { judgeFigure, movedFigure, readFigure, smallestStep, writeFigure } from './figureText.ts';
import type { Way } from './refusal.ts';

export interface FigureInput {
  readonly element: HTMLElement;
  /** Shows another value; text that is being typed is left alone. */
  readonly set: (value: Figure, origin?: Origin) => void;
  /** Shows what is wrong with the value beside it, or takes it away. */
  readonly refuse: (words: string | null, ways?: readonly Way[]) => void;
}

/** Pause after which a typed figure counts although nobody has pressed Enter, ms. */
const PAUSE_MS = 250;

const stepKeys: Readonly<Record<string, number>> = { ArrowUp: 1, ArrowDown: -1, PageUp: 10, PageDown: -10 };

/**
 * A figure to be changed in place: dragged sideways, stepped with the arrow keys (Shift ten steps, Alt a tenth), or
 * typed. Enter keeps, Escape goes back. A value against the limits is refused with a way on; the last good one is kept.
 */
export function figureInput(spec: FigureSpec): FigureInput {
  const { unknown, places, per = 1, step = 1 } = spec;
  const toShown = (value: Figure): Figure =>
    value === 'unknown' ? value : Number((value * per).toPrecision(12));
  const toValue = (shown: Figure): Figure =>
    shown === 'unknown' ? shown : Number((shown / per).toPrecision(12));

  let shown = toShown(spec.value);
  let origin = spec.origin ?? 'typed';
  /** The value when the present go at it began, to compare with and to go back to. */
  let before = shown;
  let originBefore = origin;
  /** Whether `input` has told anything since then. */
  let isTold = false;
  let isTyping = false;
  let isRefused = false;
  let isDragged = false;
  /** After a drag a press takes the whole figure again; otherwise a second press puts the caret. */
  let isReleased = false;
  let pause: ReturnType<typeof setTimeout> | undefined;

  const parts = figureField(spec);
  const { element, field, below, refusal, hasFocus, selectAll } = parts;
  const dress = (): void => parts.dress(shown, origin, isRefused);
  const write = (): void => {
    parts.write(shown, !isDragged);
    dress();
  };

  const unrefuse = (): void => {
    isRefused = false;
    refusal.clear();
  };
  const stopTyping = (): void => {
    isTyping = false;
    element.classList.remove('typing');
    clearTimeout(pause);
  };

  /** A new value that is allowed: shown and told, not yet kept. */
  const move = (next: Figure): void => {
    if (next === shown) return;
    shown = next;
    if (next !== 'unknown') origin = 'typed';
    isTold = true;
    spec.input?.(toValue(shown));
  };
  /** Ends the go at it. */
  const keep = (): void => {
    hideScale();
    before = shown;
    originBefore = origin;
    if (!isTold) return;
    isTold = false;
    spec.change?.(toValue(shown));
  };
  const goBack = (): void => {
    stopTyping();
    unrefuse();
    if (isTold) spec.drop?.();
    move(before);
    origin = originBefore;
    keep();
    write();
  };

  /** Marks the figure, and the entry of a list that it belongs to. */
  const inHand = (is: boolean): void => {
    element.classList.toggle('grasped', is);
    element.closest('.point, .strip')?.classList.toggle('in-hand', is);
  };
  const showScale = (stepNow: number): void => {
    if (shown === 'unknown') return;
    const start = before === 'unknown' ? shown : before;
    const marks = spec.marks?.() ?? [];
    const piece = figureScale({ before: start, now: shown, step: stepNow, rules: spec, marks });
    below.replaceChildren(toDom(piece, field.ownerDocument));
    inHand(true);
  };
  const hideScale = (): void => {
    below.replaceChildren();
    inHand(false);
    if (hasFocus()) offer();
  };
  /** Offers below the figure what keys do too: that it is not known, that it stands. */
  const offer = (): void => {
    const way = (words: string, take: () => void): HTMLElement => {
      const button = h('button', { type: 'button', class: 'action', tabindex: -1 }, words);
      button.addEventListener('pointerdown', (event) => {
        event.preventDefault();
        take();
      });
      return button;
    };
    const choose = (): void => {
      stopTyping();
      unrefuse();
      move('unknown');
      write();
      keep();
    };
    const { confirm } = spec;
    below.replaceChildren(
      ...(origin === 'assumed' && confirm !== undefined ? [way('confirm', confirm)] : []),
      ...(unknown !== undefined && shown !== 'unknown' ? [way(unknown, choose)] : []),
    );
  };

  const start = (): number => (shown === 'unknown' ? (spec.from ?? spec.min?.value ?? 0) : shown);
  const stepWith = (shift: boolean, alt: boolean): number =>
    Math.max(smallestStep(places), step * (shift ? 10 : alt ? 0.1 : 1));

  /** What is typed, judged: the value, or the refusal shown with its ways on. */
  const takeTyped = (isFinal: boolean): void => {
    const text = field.textContent;
    const read = readFigure(text, spec);
    const wrong = read.ok ? judgeFigure(read.value, spec) : { why: read.why, nearest: null };
    if (read.ok && wrong === null) {
      unrefuse();
      move(read.value);
      if (!isFinal) dress();
      return;
    }
    if (!isFinal || wrong === null) return;
    // What was given on the way to the refused text is taken back: the last good value is the one before.
    move(before);
    isRefused = true;
    const good = writeFigure(before, spec);
    const { nearest } = wrong;
    const take = (value: Figure) => (): void => {
      stopTyping();
      unrefuse();
      move(value);
      write();
      keep();
      field.focus();
    };
    refusal.say(`Refused: ${wrong.why}. The last good value, ${good}, is kept.`, [
      ...(nearest === null ? [] : [{ words: `Take ${writeFigure(nearest, spec)}`, take: take(nearest) }]),
      { words: `Back to ${good}`, take: take(before) },
    ]);
    dress();
  };
  const finish = (): void => {
    if (isTyping) {
      stopTyping();
      takeTyped(true);
    }
    keep();
    if (!isRefused) write();
  };

  field.addEventListener('focus', () => {
    if (!isDragged) selectAll();
    hideScale();
  });
  field.addEventListener('blur', () => {
    finish();
    below.replaceChildren();
  });
  field.addEventListener('input', () => {
    isTyping = true;
    element.classList.add('typing');
    isReleased = false;
    clearTimeout(pause);
    pause = setTimeout(() => takeTyped(false), PAUSE_MS);
  });
  field.addEventListener('keydown', (event) => {
    const { key, shiftKey, altKey } = event;
    const direction = stepKeys[key];
    if (key === 'Enter') {
      const untouched = !isTyping && shown === before;
      finish();
      if (untouched && origin !== 'typed') spec.confirm?.();
      if (!isRefused) selectAll();
    } else if (key === 'Escape') {
      goBack();
      selectAll();
    } else if (direction !== undefined) {
      if (isTyping) {
        stopTyping();
        takeTyped(false);
      }
      unrefuse();
      const by = stepWith(shiftKey, altKey);
      move(movedFigure(start(), direction * by, spec));
      write();
      showScale(by);
    } else return;
    event.preventDefault();
    event.stopPropagation();
  });

  let anchor = { value: 0, dx: 0, by: step };
  draggable(field, {
    may: () => !isTyping,
    start() {
      unrefuse();
      isDragged = true;
      anchor = { value: start(), dx: 0, by: step };
      field.focus({ preventScroll: true });
    },
    move({ dx, shift, alt }) {
      const by = stepWith(shift, alt);
      if (by !== anchor.by) anchor = { value: start(), dx, by };
      const fine = Math.max(smallestStep(places), by / 10);
      const moved = Math.round((((dx - anchor.dx) / STEP_PX) * by) / fine) * fine;
      move(movedFigure(anchor.value, moved, spec));
    },
    follow({ shift, alt }) {
      write();
      showScale(stepWith(shift, alt));
    },
    end() {
      isDragged = false;
      isReleased = true;
      keep();
      write();
      selectAll();
    },
    cancel() {
      isDragged = false;
      goBack();
    },
    tap() {
      if (!hasFocus()) field.focus();
      else if (isReleased) selectAll();
      isReleased = false;
    },
  });
  // A press takes the focus on release: until then it may become a drag.
  field.addEventListener('mousedown', (event) => {
    if (!isTyping && (isReleased || !hasFocus())) event.preventDefault();
  });

  write();
  return {
    element,
    set(value, from = origin) {
      const next = toShown(value);
      if (isTyping || (next === shown && from === origin)) return;
      if (next !== shown) unrefuse();
      const isOther = from !== origin;
      shown = next;
      origin = from;
      if (!isTold) [before, originBefore] = [shown, origin];
      write();
      if (isOther && hasFocus()) offer();
    },
    refuse(words, ways = []) {
      if (words === null) unrefuse();
      else {
        isRefused = true;
        refusal.say(words, ways);
      }
      dress();
    },
  };
}
