import type {
  DeckSpec,
  Design,
  Family,
  FormId,
  MethodId,
  Pattern,
  Problem,
  UnitTask,
  Variant,
} from '../model/index.ts';

export type { Pattern } from '../model/index.ts';

/** A structural form. `lib/forms/index.ts` is the registry. */
export interface FormModule {
  readonly id: FormId;
  readonly family: Family;
  /** Name as it is printed, e.g. 'Composite I-girders'. */
  readonly name: string;
  readonly pattern: Pattern;
  /** Other patterns that are searched as well: a long crossing need not be one form from abutment to abutment. */
  readonly alsoPatterns?: readonly Extract<Pattern, { kind: 'flanked' }>[];
  /** Methods of construction, the usual one first. */
  readonly methods: readonly [MethodId, ...MethodId[]];
  /** Longest span that `size` can lay out, m, where that is less than the published band of the form. */
  readonly mostSpanM?: number;
  /** Spans up to which a unit is made one way and another beyond, so that its cost leaps there, m. */
  readonly leapsAtM?: readonly number[];
  /** Spans of a continuous pattern that are laid as simple beams: joined for what comes later, or never; joined from the start unless given. */
  readonly joined?: 'after-placing' | 'never';
  /** The unit is the same whatever height it stands at: `clearUnderM` of its task is not read. */
  readonly ignoresHeight?: true;
  /** All supports are walls in one with the deck: `strikes` and `quakeShare` of its task are read. */
  readonly wallsInOne?: true;
  /** Of the choices of a variant those that the form has. */
  readonly choices?: readonly (keyof Variant)[];
  /** Of what a task alone may ask for besides, what the form reads. */
  readonly reads?: readonly ('girders' | 'haunch')[];
  /** Why a unit cannot be made as its choices ask, by paths of a variant; absent where nothing can be asked amiss. */
  faults?(task: Omit<UnitTask, 'depthM'>): readonly Problem[];
  /**
   * Other ways of making a unit than the plain one that are worth pricing for its spans (m), deck and method; absent where
   * the form leaves no choice.
   */
  variants?(spansM: readonly number[], deck: DeckSpec, method: MethodId): readonly Variant[];
  /**
   * Least structural depth, m, that practical parts or a published minimum leave, where a short span needs more than its
   * published ratio; absent where the published bands hold down to the shortest span.
   */
  leastDepthM?(task: Pick<UnitTask, 'standard' | 'deck' | 'spansM'>): number;
  /** Where temporary towers stand while a unit is built, m from its first support; absent where it needs none. */
  temporaryTowersM?(task: Pick<UnitTask, 'spansM' | 'method'>): readonly number[];
  /**
   * Sizes one unit. Always returns a design; where a limit cannot be met within practical plates, strands or bars the
   * offending check has a utilisation above 1 and a warning says so (the option-stage rule then puts the option out).
   */
  size(task: UnitTask): Design;
}
