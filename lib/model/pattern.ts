import type { FormId } from './ids.ts';

/** How the spans of a form may be laid out. Windows (ratios, span bands) are rules and live in `data/rules`. */
export type Pattern =
  /** One continuous unit, abutment to abutment, of at most `mostSpans` spans where that is given. */
  | { readonly kind: 'continuous'; readonly mostSpans?: number }
  /** A main unit of one simple span over the obstacle; approach units of another form on either side where needed. */
  | { readonly kind: 'simple-main'; readonly approach: FormId }
  /**
   * A continuous main unit of three spans, the longest over the obstacle; approach units on either side where needed, of
   * another form or of the same one less deep. `side` is the side span over the main span.
   */
  | {
      readonly kind: 'flanked';
      readonly approach: FormId;
      readonly side: readonly [least: number, most: number];
    }
  /**
   * A main unit hung from one or two pylons; approach units where needed.
   * `onePylonBack` and `twoPylonSide` are the back or side span over the main span that the form is laid out with.
   */
  | {
      readonly kind: 'pylon';
      readonly approach: FormId;
      readonly onePylonBack: readonly [least: number, most: number];
      readonly twoPylonSide: readonly [least: number, most: number];
    };
