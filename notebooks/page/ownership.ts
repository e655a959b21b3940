/** Which of the tabs that show a study may change it. */
export interface Ownership {
  /** Whether this tab may. */
  readonly isMine: () => boolean;
  /** Takes it over from the other tab, which may only read from then on. */
  readonly takeOver: () => void;
  /** Lets go, e.g. because the tab shows another study. */
  readonly end: () => void;
}

/** How this tab came to change a study, or why it may not: somebody else does. */
export type Told = 'first' | 'after another' | 'elsewhere';

/**
 * Asks to be the one tab that changes a study. While another does, this one waits until that is closed. Without locks in
 * the browser every tab may; the revision of what is saved then tells them apart.
 * @param told called whenever it changes who may
 */
export function ownership(locks: LockManager | undefined, id: string, told: (how: Told) => void): Ownership {
  if (locks === undefined) {
    told('first');
    return { isMine: () => true, takeOver: () => undefined, end: () => undefined };
  }
  const name = `spanledger study ${id}`;
  let isMine = false;
  let isEnded = false;
  let release: (() => void) | undefined;
  let waiting = new AbortController();

  const hold = (how: Told): Promise<void> => {
    isMine = true;
    told(how);
    return new Promise((resolve) => (release = resolve));
  };
  const lose = (): void => {
    if (isEnded) return;
    isMine = false;
    told('elsewhere');
    wait();
  };
  /** In line behind whoever has it. */
  const wait = (): void => {
    waiting = new AbortController();
    void locks
      .request(name, { signal: waiting.signal }, () => hold('after another'))
      .catch(() => (isMine ? lose() : undefined));
  };
  void locks
    .request(name, { ifAvailable: true }, (lock) => (lock === null ? lose() : hold('first')))
    .catch(lose);

  return {
    isMine: () => isMine,
    takeOver() {
      waiting.abort();
      void locks.request(name, { steal: true }, () => hold('after another')).catch(lose);
    },
    end() {
      isEnded = true;
      isMine = false;
      waiting.abort();
      release?.();
    },
  };
}
