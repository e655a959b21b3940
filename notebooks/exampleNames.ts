/** Names of the worked examples, as in an address, in the order of the shelf; the one shown without a study first. */
export const exampleNames = ['low-ferry', 'stonebeck-lane', 'tanners-yard', 'sarrow-estuary'] as const;

export type ExampleName = (typeof exampleNames)[number];

/** The example of a name, the first for a name that none of them has. */
export const exampleNamed = (name: string | null): ExampleName =>
  exampleNames.find((known) => known === name) ?? exampleNames[0];
