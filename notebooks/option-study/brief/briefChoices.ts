import {
  standardNames,
  type Access,
  type Demands,
  type Obstacle,
  type Road,
  type StandardId,
} from '../../../lib/index.ts';
import { supportsWords, type Choice } from '../../page/index.ts';

/** Words of the choices in the brief. */
export const obstacleKindChoices: readonly Choice<Obstacle['kind']>[] = [
  { value: 'river', words: 'river' },
  { value: 'railway', words: 'railway' },
  { value: 'road', words: 'road' },
  { value: 'bank', words: 'bank' },
  { value: 'utility', words: 'utility' },
  { value: 'heritage', words: 'heritage' },
];

export const supportChoices: readonly Choice<Obstacle['supports']>[] = [
  { value: 'hard', words: supportsWords.hard },
  { value: 'soft', words: supportsWords.soft },
  { value: 'none', words: supportsWords.none },
];

export const fixedEndChoices: readonly Choice<Road['fixedEnd']>[] = [
  { value: 'both', words: 'neither end' },
  { value: 'start', words: 'the end' },
  { value: 'end', words: 'the start' },
  { value: 'none', words: 'either end' },
];

export const tieInChoices: readonly Choice<Road['startTieIn']>[] = [
  { value: 'moves', words: 'moves' },
  { value: 'fixed', words: 'stays' },
];

export const approachSideChoices: readonly Choice<Road['approachSides']>[] = [
  { value: 'slopes', words: 'run out in side slopes' },
  { value: 'walls', words: 'stand between walls' },
];

export const loadingChoices: readonly Choice<StandardId>[] = [
  { value: 'lm1', words: standardNames.lm1 },
  { value: 'hl93', words: standardNames.hl93 },
];

export const gasMainChoices: readonly Choice<Demands['gasMain']>[] = [
  { value: 'none', words: 'no gas main' },
  { value: 'outside', words: 'a gas main outside' },
  { value: 'inside', words: 'a gas main hidden inside' },
];

/** Lanes kept in use while the bridge is built, as many as a study may have. */
export const lanesKeptChoices: readonly Choice<string>[] = [
  { value: '0', words: 'no lane stays' },
  { value: '1', words: 'one lane stays' },
  ...['two', 'three', 'four', 'five', 'six', 'seven', 'eight'].map((count, i) => ({
    value: String(i + 2),
    words: `${count} lanes stay`,
  })),
];

/** Yes, no, or not known, as a choice. */
export type YesNo = 'yes' | 'no' | 'unknown';

export const yesNoOf = (value: Access['crane']): YesNo =>
  value === 'unknown' ? value : value ? 'yes' : 'no';

export const fromYesNo = (value: YesNo): Access['crane'] => (value === 'unknown' ? value : value === 'yes');
