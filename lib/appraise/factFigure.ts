import {
  described,
  type AppraisedOption,
  type At,
  type Described,
  type Descriptor,
  type Facts,
  type Inputs,
} from '../model/index.ts';
import { factDictionary, withRatios, type Fact } from '../rules/index.ts';
import { optionFacts } from './facts.ts';

const known = new WeakMap<AppraisedOption, Facts>();

/** Facts of an option as the rules were asked with them, ratios included. */
export function factsOf(at: At): Facts {
  const { study, appraisal, option } = at;
  const found =
    known.get(option) ??
    withRatios(
      optionFacts(
        study,
        at.site,
        option,
        option.headroom,
        appraisal.standing.within[option.number] ?? 'unknown',
      ),
    );
  known.set(option, found);
  return found;
}

/** A fact of the dictionary. */
export const factOf = (id: string): Fact => factDictionary.find((entry) => entry.id === id)!;

/** Where a fact comes from; facts without an entry here are read as they stand. */
export const fact = <const I extends Inputs>(
  id: string,
  formula: string,
  inputs: (at: At) => I,
  compute?: Described<I>['compute'],
): Descriptor =>
  described({
    path: `options/:option/facts/${id}`,
    label: factOf(id).label,
    unit: factOf(id).unit,
    method: 'fact for the rules',
    formula,
    value: (at) => factsOf(at)[id] ?? 'unknown',
    inputs,
    ...(compute === undefined ? {} : { compute }),
  });

/** A fact that is another figure read on. */
export const asIs = (
  id: string,
  inputs: (at: At) => Readonly<Record<string, string>>,
  formula = factOf(id).meaning,
): Descriptor => fact(id, formula, inputs, (v) => Object.values(v)[0] as number);
