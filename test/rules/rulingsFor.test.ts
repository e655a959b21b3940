import { describe, expect, it } from 'vitest';
import { missingFacts, rulingsFor, statusFlip, statusOf } from '../../lib/rules/index.ts';

const site = { planRadiusM: Infinity, skewDeg: 0, deckWidthM: 12.5 };
const by = (rulings: ReturnType<typeof rulingsFor>, id: string) => rulings.find(({ rule }) => rule === id);

describe('rulingsFor(askedOf, form, facts)', () => {
  it('[R6] [R8] puts a form out with the number, the limit and the source', () => {
    const ruling = by(rulingsFor('form', 'precast-i', { ...site, mainSpanM: 84 }), 'precast-i-span-most');
    expect(ruling).toMatchObject({
      effect: 'out',
      because: ['needs 84 m; precast I of constant depth, spliced on towers, stops at 73 m'],
      flip: { fact: 'mainSpanM', from: 84, to: 73, unit: 'm' },
    });
    expect(ruling?.source).toContain('Khan');
    expect(ruling?.source).toContain('(read)');
  });

  it('[R6] a rule that does not apply is silent', () => {
    expect(
      by(rulingsFor('form', 'precast-i', { ...site, mainSpanM: 30 }), 'precast-i-span-most'),
    ).toBeUndefined();
  });

  it('[R6] asks each rule only at its own points', () => {
    expect(by(rulingsFor('form', 'truss', { ...site, mainSpanM: 20 }), 'truss-span-least')).toBeUndefined();
    expect(
      by(rulingsFor('arrangement', 'truss', { ...site, mainSpanM: 20 }), 'truss-span-least')?.effect,
    ).toBe('out');
    const all = rulingsFor(['form', 'arrangement', 'option'], 'composite-i', { ...site, mainSpanM: 60 });
    expect(all.filter(({ rule }) => rule === 'composite-i-span-usual')).toHaveLength(1);
  });

  it('[R7] an unknown fact gives a point to confirm that says what is missing, without a flip', () => {
    const ruling = by(rulingsFor('form', 'composite-i', { mainSpanM: 60 }), 'composite-i-curve');
    expect(ruling?.effect).toBe('to confirm');
    expect(ruling?.because[0]).toMatch(/^not known yet: plan radius; needed for: /u);
    expect(ruling?.flip).toBeUndefined();
  });

  it('[R7] haul limits nobody knows are a point to confirm; a deck cast in place does not ask for them', () => {
    const piece = {
      ...site,
      pieceLengthM: 38,
      pieceMassT: 60,
      haulLengthM: 'unknown',
      haulMassT: 'unknown',
    } as const;
    expect(by(rulingsFor('option', 'precast-i', piece), 'haul-length-precast')?.effect).toBe('to confirm');
    const cast = { ...piece, pieceLengthM: 0, pieceMassT: 0 };
    expect(by(rulingsFor('option', 'precast-i', cast), 'haul-length-precast')).toBeUndefined();
  });

  it('[R6] depth outside its published band is to be confirmed, inside it is in favour, and silent for other spans', () => {
    const at = (depthRatio: number, continuity: 'simple' | 'continuous') =>
      rulingsFor('option', 'composite-i', {
        ...site,
        continuity,
        method: 'crane',
        haunched: false,
        depthRatio,
      });
    expect(by(at(0.04, 'continuous'), 'composite-i-depth-continuous')?.effect).toBe('in favour');
    expect(by(at(0.08, 'continuous'), 'composite-i-depth-continuous')?.effect).toBe('to confirm');
    expect(by(at(0.08, 'continuous'), 'composite-i-depth-simple')).toBeUndefined();
    expect(by(at(0.03, 'continuous'), 'composite-i-optional-depth-continuous')?.because[0]).toContain('1/31');
  });

  it('[R8] words that follow a count are those for one or for more', () => {
    const said = (fact: 'supportsBarred' | 'supportsSoft', count: number): string | undefined => {
      const id = fact === 'supportsBarred' ? 'support-barred' : 'support-soft';
      return by(rulingsFor('option', 'composite-i', { ...site, [fact]: count }), id)?.because[0];
    };
    expect(said('supportsBarred', 1)).toBe('1 of its supports stands where the brief allows none');
    expect(said('supportsBarred', 3)).toBe('3 of its supports stand where the brief allows none');
    expect(said('supportsSoft', 1)).toMatch(/^1 of its supports stands where/u);
    expect(said('supportsSoft', 2)).toMatch(/^2 of its supports stand where/u);
  });

  it('[R8] names the limit that decided, not every limit of the condition', () => {
    const side = (sideSpanRatio: number) =>
      by(rulingsFor('arrangement', 'cable-stayed', { pylons: 2, sideSpanRatio }), 'cable-stayed-side-span')
        ?.because[0];
    expect(side(0.2)).toBe('side span 0.2 of the main span; beyond 0.33 back-stays and bending grow');
    expect(side(0.48)).toBe('side span 0.48 of the main span; beyond 0.47 back-stays and bending grow');
  });

  it('[R8] prints units and shares as an engineer writes them', () => {
    const spoken = rulingsFor(['form', 'option'], 'concrete-box', {
      skewDeg: 50,
      budgetChance: 0.15,
      upliftKN: 412.4,
    });
    const because = (id: string) => by(spoken, id)?.because[0];
    expect(because('skew-acute-corner')).toMatch(/^skew 50°; over 30° the acute corners may lift/u);
    expect(because('skew-beyond-factors')).toBeUndefined();
    expect(because('skew-high')).toMatch(/^skew 50°; over 45° /u);
    expect(because('budget-chance')).toMatch(/^15 % chance .* under 20 % /u);
    expect(because('end-uplift')).toMatch(/^412 kN of uplift/u);
    expect(by(spoken, 'budget-chance')?.source).toBe('Common practice, no source');
  });

  it('[R10] forms ratios from their parts and leaves given ones alone', () => {
    const parts = { ...site, mainSpanM: 80, continuity: 'continuous', supportDepthM: 2 } as const;
    const shallow = by(rulingsFor('option', 'composite-i', parts), 'composite-i-optional-depth-continuous');
    expect(shallow?.flip).toMatchObject({ fact: 'depthRatio', from: 0.025, to: 0.032 });
    expect(
      by(
        rulingsFor('option', 'composite-i', { ...parts, depthRatio: 0.04 }),
        'composite-i-optional-depth-continuous',
      ),
    ).toBeUndefined();
  });

  it('[R10] refuses a fact that is not in the dictionary or not of its kind', () => {
    expect(() => rulingsFor('form', 'slab', { spam: 1 })).toThrow(/unknown fact: spam/);
    expect(() => rulingsFor('form', 'slab', { mainSpanM: 'wide' })).toThrow(
      /mainSpanM: expected a number, received wide/,
    );
    expect(() => rulingsFor('option', 'slab', { continuity: 'curved' })).toThrow(
      /expected one of simple, continuous/,
    );
  });

  it.each([
    ['strength', { limitingUtilisation: 1.08 }, 'out'],
    ['headroom', { headroomSpareM: -0.2 }, 'out'],
    ['clearance-preset', { clearanceConfirmed: false }, 'to confirm'],
    ['end-uplift', { upliftKN: 300 }, 'caution'],
    ['launch-alignment', { method: 'launch', radiusConstant: false }, 'out'],
    ['falsework-railway', { method: 'falsework', falseworkOverRailway: true }, 'caution'],
    ['falsework-water', { method: 'falsework', falseworkOverWater: true }, 'caution'],
    ['pier-in-river', { supportsInRiver: 1 }, 'caution'],
    ['support-barred', { supportsBarred: 1 }, 'out'],
    ['box-inside', { boxInnerHeightM: 1.6 }, 'caution'],
    ['budget-chance', { budgetChance: 0.15 }, 'caution'],
    ['road-rise', { roadRiseM: 1.2, roadMayRiseM: 1 }, 'out'],
  ] as const)('%s speaks of a concrete box', (id, facts, effect) => {
    expect(by(rulingsFor(['arrangement', 'option'], 'concrete-box', facts), id)?.effect).toBe(effect);
  });

  it('box headroom is asked of boxes only', () => {
    expect(by(rulingsFor('option', 'composite-i', { boxInnerHeightM: 1.6 }), 'box-inside')).toBeUndefined();
  });
});

describe('missingFacts(askedOf, form, facts)', () => {
  it('[R9] ranks what can put an option out before what can only caution', () => {
    const missing = missingFacts('option', 'composite-i', { clearanceConfirmed: true });
    const place = (id: string) => missing.findIndex(({ fact }) => fact === id);
    expect(place('headroomSpareM')).toBeLessThan(place('budgetChance'));
    expect(place('clearanceConfirmed')).toBe(-1);
    expect(missing.map(({ weight }) => weight)).toEqual(
      missing.map(({ weight }) => weight).sort((a, b) => b - a),
    );
  });
  it('[R9] is empty once everything is known', () => {
    expect(missingFacts('form', 'slab', { ...site, mainSpanM: 12 })).toEqual([]);
  });
});

describe('statusOf(rulings)', () => {
  const status = (mainSpanM: number, more: object = {}) =>
    statusOf(rulingsFor('form', 'composite-i', { ...site, mainSpanM, ...more }));
  it('[R16] in inside the usual band, possible outside it, out beyond the longest', () => {
    expect(status(60)).toBe('in');
    expect(status(110)).toBe('possible');
    expect(status(130)).toBe('out');
  });
  it('[R16] a caution takes it from in to possible, a point to confirm does not', () => {
    expect(status(60, { planRadiusM: 150 })).toBe('possible');
    expect(status(60, { skewDeg: 30 })).toBe('in');
    expect(status(60, { planRadiusM: 'unknown' })).toBe('in');
  });
  it('[R16] favour for the depth alone does not make an option in', () => {
    expect(statusOf([{ rule: 'composite-i-depth-continuous', effect: 'in favour' }])).toBe('possible');
  });
});

describe('statusFlip(askedOf, form, facts)', () => {
  it('[R11] names the nearest number after which the status is another', () => {
    expect(statusFlip('form', 'composite-i', { ...site, mainSpanM: 85 })).toMatchObject({
      fact: 'mainSpanM',
      to: 91.1,
    });
    expect(statusFlip('form', 'composite-i', { ...site, mainSpanM: 85, planRadiusM: 260 })).toMatchObject({
      fact: 'planRadiusM',
      to: 249,
    });
  });
});
