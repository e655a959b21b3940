/** Identifiers shared by every stage. */

/** Families of structural forms, in the order in which they are listed everywhere. */
export const families = ['slab', 'girder', 'box', 'truss', 'arch', 'cable-supported'] as const;
export type Family = (typeof families)[number];

/** Structural forms the tool knows by name; `lib/forms/index.ts` lists those it can size. */
export const formIds = [
  'slab',
  'portal-frame',
  'precast-i',
  'precast-trough',
  'half-through',
  'composite-i',
  'adjacent-box',
  'composite-box',
  'concrete-box',
  'cantilever-box',
  'steel-box',
  'truss',
  'tied-arch',
  'deck-arch',
  'extradosed',
  'cable-stayed',
  'suspension',
] as const;
export type FormId = (typeof formIds)[number];

/** A form in running words: 'portal-frame' -> 'portal frame', 'composite-i' -> 'composite I'. */
export const formWords = (form: FormId): string => form.replaceAll('-', ' ').replace(/ i$/u, ' I');

/** The family each form belongs to. */
export const familyOf: Readonly<Record<FormId, Family>> = {
  slab: 'slab',
  'portal-frame': 'girder',
  'precast-i': 'girder',
  'precast-trough': 'girder',
  'half-through': 'girder',
  'composite-i': 'girder',
  'adjacent-box': 'box',
  'composite-box': 'box',
  'concrete-box': 'box',
  'cantilever-box': 'box',
  'steel-box': 'box',
  truss: 'truss',
  'tied-arch': 'arch',
  'deck-arch': 'arch',
  extradosed: 'cable-supported',
  'cable-stayed': 'cable-supported',
  suspension: 'cable-supported',
};

/** Methods of construction. */
export const methodIds = [
  'crane',
  'falsework',
  'launch',
  'float-in',
  'balanced-cantilever',
  'stay-cantilever',
] as const;
export type MethodId = (typeof methodIds)[number];

/** Methods of construction in words. */
export const methodNames: Readonly<Record<MethodId, string>> = {
  crane: 'lifting by crane',
  falsework: 'casting on falsework',
  launch: 'launching',
  'float-in': 'floating in',
  'balanced-cantilever': 'balanced cantilevering',
  'stay-cantilever': 'cantilevering on stays',
};

/** Traffic load standards. Each is a data file in `data/standards`. */
export const standardIds = ['lm1', 'hl93'] as const;
export type StandardId = (typeof standardIds)[number];

/** Traffic load standards in words. */
export const standardNames: Readonly<Record<StandardId, string>> = {
  lm1: 'EN 1991-2, LM1',
  hl93: 'AASHTO HL-93',
};

/** Ground classes; each has its own foundation. */
export const groundClassIds = ['rock', 'gravel', 'stiff-clay', 'soft-clay'] as const;
export type GroundClassId = (typeof groundClassIds)[number];

/** Parts of the crossing under which the bill is drawn up, in the order of the bill. */
export const billParts = [
  'deck',
  'bearings-joints',
  'pylons',
  'piers',
  'foundations',
  'abutments',
  'approaches',
  'river-works',
  'temporary-works',
  'traffic-management',
  'preliminaries',
] as const;
export type BillPart = (typeof billParts)[number];
