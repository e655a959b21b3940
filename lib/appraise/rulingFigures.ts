import { described, formWords, type At, type Descriptor } from '../model/index.ts';
import { factDictionary, printed, rule, type Fact } from '../rules/index.ts';
import { factsIn } from '../rules/limitsOn.ts';
import { wholeCondition } from '../rules/verdictOf.ts';

const ruleOf = (at: At) => rule(at.name('rule'));
const rulingOf = (at: At) => at.option.rulings.find((ruling) => ruling.rule === at.name('rule'))!;
const ruleFacts = (at: At): string[] =>
  [...new Set(factsIn(wholeCondition(ruleOf(at))))].map((id) => `${at.root}/facts/${id}`);
const flipFact = (at: At): Fact => factDictionary.find(({ id }) => id === rulingOf(at).flip!.fact)!;

/** What the rules say of an option. */
export const rulingFigures: readonly Descriptor[] = [
  described({
    path: 'options/:option/rulings/:rule/effect',
    label: (at) => ruleOf(at).title,
    unit: '',
    method: 'rule',
    formula: (at) => rulingOf(at).because.join('; '),
    inputs: (at) => ({ facts: ruleFacts(at) }),
    sources: (at) => ruleOf(at).sources,
  }),
  described({
    path: 'options/:option/rulings/:rule/flip/from',
    label: (at) => `${flipFact(at).label}, as it is`,
    unit: (at) => rulingOf(at).flip!.unit,
    method: 'fact for the rules',
    formula: (at) => printed(flipFact(at), rulingOf(at).flip!.from),
    inputs: (at) => ({ fact: `${at.root}/facts/${rulingOf(at).flip!.fact}` }),
    compute: (v) => v.fact,
  }),
  described({
    path: 'options/:option/rulings/:rule/flip/to',
    label: (at) => `${flipFact(at).label} that would turn the ruling`,
    unit: (at) => rulingOf(at).flip!.unit,
    method: 'nearest limit of the rule',
    formula: (at) => `${ruleOf(at).title}: first step past the limit, everything else as it is`,
    inputs: (at) => ({ facts: ruleFacts(at) }),
    sources: (at) => ruleOf(at).sources,
  }),
  described({
    path: 'options/:option/status',
    label: (at) => `status of option ${at.option.number}`,
    unit: '',
    method: 'rules',
    formula: 'out: any rule puts it out; in: inside its usual span band and no caution; else possible',
    inputs: (at) => ({ rulings: at.option.rulings.map(({ rule: id }) => `${at.root}/rulings/${id}/effect`) }),
  }),
  described({
    path: 'droppedCounts/:i/count',
    label: (at) => {
      const { form, reason } = at.appraisal.droppedCounts[at.index('i')]!;
      return `arrangements of ${formWords(form)} not kept: ${reason}`;
    },
    unit: 'no',
    method: 'count',
    formula: (at) => at.appraisal.droppedCounts[at.index('i')]!.reason,
    inputs: (at) => {
      const { form } = at.appraisal.droppedCounts[at.index('i')]!;
      return { length: 'site/lengthM', span: [`windows/${form}/span/least`, `windows/${form}/span/most`] };
    },
  }),
];
