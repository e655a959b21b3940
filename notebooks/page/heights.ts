import type { Rests } from './rests.ts';

/** Heights of the sections, which hold also while a section is off the screen and not laid out. */
export interface Heights {
  /** Something in the section has been drawn that is not laid out: its height is found out when the page is idle. */
  readonly changed: (section: HTMLElement) => void;
  readonly end: () => void;
}

/** After all drawings have been made, which have places below this. */
const AFTER_DRAWINGS = 1000;

/**
 * Tells the browser how high each section is when it is laid out, so that nothing moves when it comes on the screen: as
 * it was when last seen, and as it has become when it was drawn unseen.
 */
export function heights(sections: readonly HTMLElement[], rests: Rests): Heights {
  const set = (section: HTMLElement, heightPx: number): void => {
    section.style.containIntrinsicHeight = `${String(heightPx)}px`;
  };
  const observer = new ResizeObserver((entries) => {
    for (const { target, contentRect } of entries) set(target as HTMLElement, contentRect.height);
  });
  for (const section of sections) observer.observe(section);

  const measures = new Map(
    sections.map((section, i) => {
      const measure = (): void => {
        // To ask lays out what is in it, and nothing else.
        const bottom = section.lastElementChild?.getBoundingClientRect().bottom;
        if (bottom !== undefined) set(section, bottom - section.getBoundingClientRect().top);
      };
      return [section, { measure, place: AFTER_DRAWINGS + i }];
    }),
  );

  return {
    changed(section) {
      const found = measures.get(section);
      if (found !== undefined) rests.put(found.measure, found.place);
    },
    end() {
      observer.disconnect();
      for (const { measure } of measures.values()) rests.drop(measure);
    },
  };
}
