import { screenFrames } from './frames.ts';

/** How far the pointer has come since it went down, px, and which keys are held. */
export interface DragAt {
  readonly dx: number;
  readonly dy: number;
  readonly shift: boolean;
  readonly alt: boolean;
}

export interface Drag {
  /** The pointer went down; false leaves it to the browser. */
  readonly may?: (event: PointerEvent) => boolean;
  /** It has moved far enough to be a drag. */
  readonly start?: () => void;
  readonly move: (at: DragAt) => void;
  /** Shows at the end of every frame how far the pointer has come; what `move` has changed may be drawn later. */
  readonly follow?: (at: DragAt) => void;
  /** Released: what was moved stays. */
  readonly end: () => void;
  /** Escape, or the pointer was taken away: back to where it was. */
  readonly cancel: () => void;
  /** Pressed and released in place. */
  readonly tap?: () => void;
  /** A finger drags it as well: for things whose style keeps the page from scrolling with it. */
  readonly byFinger?: boolean;
}

/** Movement that still counts as a press in place, px. */
const SLACK_PX = 3;

/** A drag that rests for this long lets slow work go on, ms. */
const REST_MS = 120;

/** A timer as late as this was kept by a busy page, ms. */
const LATE_MS = 40;

/**
 * Runs a job once a drag has rested. Where the page was too busy to run it in time the hand has had no chance to move on:
 * it is given one more rest. Gives back what calls it off.
 */
function onceRested(job: () => void): () => void {
  const due = performance.now() + REST_MS;
  let timer = setTimeout(() => {
    if (performance.now() - due < LATE_MS) job();
    else timer = setTimeout(job, REST_MS);
  }, REST_MS);
  return () => clearTimeout(timer);
}

/** Whether something is being dragged: what is not seen then waits. */
export const isDragging = (): boolean => document.documentElement.classList.contains('dragging');

/**
 * Resolves at once unless something is dragged, else on its release or once it rests: what takes long waits for that. Never
 * resolves after `signal` has been aborted, which is what the next step of the drag does.
 */
export function untilDragRests(signal: AbortSignal): Promise<void> {
  if (!isDragging()) return Promise.resolve();
  return new Promise((resolve) => {
    signal.addEventListener('abort', onceRested(resolve));
    document.addEventListener('pointerup', () => resolve(), { once: true, signal });
  });
}

type Told = (isMoving: boolean) => void;
const told = new Set<Told>();
/** Calls off what comes with the rest; none while nothing moves. */
let callOff: (() => void) | undefined;

function moving(isMoving: boolean): void {
  const was = callOff !== undefined;
  callOff?.();
  callOff = isMoving ? onceRested(() => moving(false)) : undefined;
  if (was !== isMoving) for (const tell of told) tell(isMoving);
}

/** Tells when something dragged begins to move, and when it rests or has been released: the time between is the hand's. */
export const whileDragged = (tell: Told): void => void told.add(tell);

/**
 * Makes an element draggable with mouse or pen. The drag lives on the document, so that it goes on when a new drawing
 * takes the place of the element under the pointer. Touch is left to the browser, which scrolls with it, unless asked for.
 */
export function draggable(
  element: Element,
  { may, start, move, follow, end, cancel, tap, byFinger = false }: Drag,
): void {
  element.addEventListener('pointerdown', (event) => {
    const down = event as PointerEvent;
    if (down.button !== 0 || !down.isPrimary || (down.pointerType === 'touch' && !byFinger)) return;
    if (may?.(down) === false) return;
    const page = element.ownerDocument;
    const listening = new AbortController();
    const { signal } = listening;
    let isDrag = false;
    /** Where it has come to and has not been moved to yet: of several moves in one frame only the last is seen. */
    let waiting: DragAt | null = null;
    let latest: DragAt = { dx: 0, dy: 0, shift: false, alt: false };
    let isFollowing = false;
    const followNow = (): void => {
      isFollowing = false;
      if (!signal.aborted) follow?.(latest);
    };
    const moveNow = (): void => {
      if (waiting === null) return;
      const at = waiting;
      waiting = null;
      if (isDragging()) moving(true);
      move(at);
    };

    const stop = (): void => {
      listening.abort();
      page.documentElement.classList.remove('dragging');
      moving(false);
    };
    const onMove = ({ clientX, clientY, shiftKey, altKey }: PointerEvent): void => {
      const at = { dx: clientX - down.clientX, dy: clientY - down.clientY, shift: shiftKey, alt: altKey };
      if (!isDrag && Math.hypot(at.dx, at.dy) <= SLACK_PX) return;
      if (!isDrag) {
        isDrag = true;
        page.documentElement.classList.add('dragging');
        page.getSelection()?.removeAllRanges();
        start?.();
      }
      if (waiting === null) screenFrames.hand(moveNow);
      waiting = latest = at;
      if (isFollowing) return;
      isFollowing = true;
      screenFrames.ending(followNow);
    };
    const onUp = (): void => {
      // The last move is no step of a drag any more: what it asks for need not wait for a rest.
      stop();
      moveNow();
      if (isDrag) end();
      else tap?.();
    };
    const onCancel = (): void => {
      waiting = null;
      stop();
      if (isDrag) cancel();
    };
    const onKey = (pressed: KeyboardEvent): void => {
      if (pressed.key !== 'Escape' || !isDrag) return;
      pressed.preventDefault();
      pressed.stopPropagation();
      onCancel();
    };
    // Nothing is selected on the way.
    page.addEventListener('selectstart', (event) => event.preventDefault(), { signal });
    page.addEventListener('pointermove', onMove, { signal });
    page.addEventListener('pointerup', onUp, { signal });
    page.addEventListener('pointercancel', onCancel, { signal });
    page.addEventListener('keydown', onKey, { signal, capture: true });
  });
}
