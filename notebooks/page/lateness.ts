/** A pause shorter than this is not worth a mark, ms. */
const MARK_AFTER_MS = 150;

export interface Lateness {
  /** Says whether something is being waited for. */
  readonly set: (isWaiting: boolean) => void;
  /** Whether it has been waited for so long that it should be seen. */
  readonly isLate: () => boolean;
  readonly end: () => void;
}

/** Tells by `tell` when something has been waited for longer than a moment, so that short pauses do not flicker. */
export function lateness(tell: () => void): Lateness {
  let timer: ReturnType<typeof setTimeout> | undefined;
  let late = false;
  const end = (): void => {
    clearTimeout(timer);
    timer = undefined;
  };
  return {
    set(isWaiting) {
      if (!isWaiting) {
        end();
        late = false;
      } else {
        timer ??= setTimeout(() => {
          late = true;
          tell();
        }, MARK_AFTER_MS);
      }
    },
    isLate: () => late,
    end,
  };
}
