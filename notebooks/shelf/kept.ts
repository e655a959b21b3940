import { readStudy, survey, type Problem, type Site } from '../../lib/index.ts';
import type { StoredStudy, StudyCupboard } from '../page/index.ts';
import { untaken } from './untaken.ts';

/** A study on the device as the shelf shows it. */
export interface KeptStudy {
  readonly stored: StoredStudy;
  /** The crossing, or why the stored text cannot be read; nothing is lost by that, it can still be saved as a file. */
  readonly read:
    | { readonly ok: true; readonly site: Site }
    | { readonly ok: false; readonly problems: readonly Problem[] };
}

/** Every study on the device with its crossing, newest first. */
export async function keptStudies(cupboard: StudyCupboard): Promise<readonly KeptStudy[]> {
  const all = await cupboard.all();
  return [...all]
    .sort((a, b) => (a.savedAt < b.savedAt ? 1 : -1))
    .map((stored) => {
      const study = readStudy(stored.text);
      return {
        stored,
        read: study.ok
          ? { ok: true, site: survey(study.value.brief) }
          : { ok: false, problems: study.problems },
      };
    });
}

/** The moment of saving in the time of the device: 'today 14:02', else '2026-02-12 09:30'. */
export function savedAtWords(savedAt: string, now: Date): string {
  const date = new Date(savedAt);
  const two = (part: number): string => String(part).padStart(2, '0');
  const day = (of: Date): string => `${of.getFullYear()}-${two(of.getMonth() + 1)}-${two(of.getDate())}`;
  const time = `${two(date.getHours())}:${two(date.getMinutes())}`;
  return day(date) === day(now) ? `today ${time}` : `${day(date)} ${time}`;
}

/** Title of a duplicate, told from those that are there: 'Mill Lane, copy', 'Mill Lane, copy 2'. */
export function copyTitle(title: string, titles: readonly string[]): string {
  // A title is at most 500 characters long.
  return untaken(`${title.slice(0, 480)}, copy`, titles);
}
