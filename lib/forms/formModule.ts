import type { Design, Family, FormId, MethodId, UnitTask } from '../model/index.ts';

/** How the spans of a form may be laid out. Windows (ratios, span bands) are rules and live in `data/rules`. */
export type Pattern =
  /** One continuous unit, abutment to abutment. */
  | { readonly kind: 'continuous' }
  /** A main unit of one simple span over the obstacle; approach units of another form on either side where needed. */
  | { readonly kind: 'simple-main'; readonly approach: FormId }
  /**
   * A main unit hung from one or two pylons; approach units where needed.
   * `sideRatio` is the side span over the main span that the form is laid out with for each pylon count.
   */
  | {
      readonly kind: 'pylon';
      readonly approach: FormId;
      readonly onePylonBack: readonly [least: number, most: number];
      readonly twoPylonSide: readonly [least: number, most: number];
    };

/** A structural form. `lib/forms/index.ts` is the registry. */
export interface FormModule {
  readonly id: FormId;
  readonly family: Family;
  /** Name as it is printed, e.g. 'Composite I-girders'. */
  readonly name: string;
  readonly pattern: Pattern;
  /** Methods of construction, the usual one first. */
  readonly methods: readonly [MethodId, ...MethodId[]];
  /**
   * Sizes one unit. Always returns a design; where a limit cannot be met within practical plates, strands or bars the
   * offending check has a utilisation above 1 and a warning says so (the option-stage rule then puts the option out).
   */
  size(task: UnitTask): Design;
}
