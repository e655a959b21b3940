import { describe, expect, it } from 'vitest';
import { fingerprint } from '../../lib/index.ts';
import {
  priorityNames,
  renamed,
  withNewPriority,
  withoutPriority,
  withWeight,
} from '../../notebooks/option-study/priorities/priorityEdits.ts';
import { placesOf, workedStudy } from './study.ts';

const study = workedStudy();
const one = renamed(withNewPriority(study).study, 'new priority', 'short closure of the railway');

describe('priorities', () => {
  it('withNewPriority: weight 1 under a name of its own, and the study is valid and asks the same', () => {
    const { study: first, name } = withNewPriority(study);
    expect(first.priorities.weights).toEqual({ [name]: 1 });
    const second = withNewPriority(first);
    expect(second.name).not.toBe(name);
    expect(priorityNames(second.study)).toHaveLength(2);
    expect(placesOf(second.study)).toEqual([]);
    expect(fingerprint(second.study)).toBe(fingerprint(study));
  });

  it('renamed: keeps the weight, counts on where the name is taken, and without a name takes it out', () => {
    const weighed = withWeight(one, 'short closure of the railway', 3);
    expect(renamed(weighed, 'short closure of the railway', 'look').priorities.weights).toEqual({ look: 3 });
    const two = withNewPriority(weighed);
    const same = renamed(two.study, two.name, 'short closure of the railway');
    expect(same.priorities.weights).toEqual({
      'short closure of the railway': 3,
      'short closure of the railway 2': 1,
    });
    expect(renamed(weighed, 'short closure of the railway', '').priorities.weights).toEqual({});
    expect(renamed(weighed, 'no such', 'look')).toBe(weighed);
  });

  it('renamed: a name that no study file may hold is counted on', () => {
    const odd = renamed(one, 'short closure of the railway', '__proto__');
    expect(priorityNames(odd)).toEqual(['__proto__ 2']);
    expect(placesOf(odd)).toEqual([]);
  });

  it('withWeight and withoutPriority: of one that is there', () => {
    expect(withWeight(one, 'no such', 2)).toBe(one);
    expect(withoutPriority(one, 'short closure of the railway').priorities.weights).toEqual({});
  });
});
