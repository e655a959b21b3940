import { concrete, loadStandard, materials, type Concrete, type LoadStandard } from '../../actions/index.ts';
import { frameEffects, planeFrame, type FrameEffects, type FrameLoad } from '../../mechanics/index.ts';
import type { StandardId, UnitTask } from '../../model/index.ts';
import { pressureAt, pressureOnNodes, ratchetPressure } from './earth.ts';
import { frameShape, type FrameShape } from './frameShape.ts';
import { portalData } from './portalData.ts';

/** Effects of one load case along the chain. */
export interface ChainEffects {
  /** At the nodes, tension of the inner face positive. */
  readonly momentKNm: Float64Array;
  /** At the nodes, compression positive. */
  readonly thrustKN: Float64Array;
  /** In the members. */
  readonly shearKN: Float64Array;
  /** On the footings: downwards, towards the span, moment that turns it towards the span. */
  readonly feet: readonly [FootLoad, FootLoad];
  /** Downwards at the middle of the span, m. */
  readonly middleM: number;
}

export interface FootLoad {
  readonly verticalKN: number;
  readonly alongKN: number;
  readonly momentKNm: number;
}

/** The frame on feet of one kind, with every action worked out alone. */
export interface FrameOnFeet {
  readonly feet: 'stiff' | 'soft';
  readonly own: ChainEffects;
  readonly superimposed: ChainEffects;
  /** Fill on both walls with a coefficient of 1. */
  readonly earth: ChainEffects;
  /** Fill on both walls pressed by the warm deck, K*. */
  readonly pressedEarth: ChainEffects;
  readonly pressure: number;
  /** Traffic behind one wall, at rest. */
  readonly surcharge: readonly [ChainEffects, ChainEffects];
  /** 1 kN along the deck, towards its end. */
  readonly braking: ChainEffects;
  /** Deck longer by 1e-5, whole stiffness. */
  readonly longer: ChainEffects;
  /** Top of the deck warmer by 1 K, whole stiffness. */
  readonly topWarmer: ChainEffects;
  /** 1 kN down on each deck node. */
  readonly unit: readonly ChainEffects[];
  /** Any further case. */
  readonly run: (load: FrameLoad) => ChainEffects;
}

/** A portal frame but its steel. Everything of the whole deck width. */
export interface FrameModel {
  readonly task: UnitTask;
  readonly standardId: StandardId;
  readonly standard: LoadStandard;
  readonly concrete: Concrete;
  readonly prestressed: boolean;
  readonly shape: FrameShape;
  /** Members between nodes: length, m. */
  readonly memberM: Float64Array;
  /** Nodes of the deck, axis to axis, and their x, m. */
  readonly deckNodes: readonly number[];
  readonly deckXM: Float64Array;
  /** Nodes at which sections are designed: feet to soffits, faces of the walls to each other. */
  readonly designNodes: readonly number[];
  readonly deckM3: number;
  readonly wallM3: readonly [number, number];
  readonly cases: readonly FrameOnFeet[];
}

/** Lays out a frame and works out every action on stiff and on soft feet. */
export function frameModel(task: UnitTask): FrameModel {
  const { standard: standardId, deck, spansM } = task;
  const standard = loadStandard(standardId);
  const shape = frameShape(task);
  const { nodes, sections, knees } = shape;
  const prestressed = spansM[0]! > portalData.reinforced.mostSpanM;
  const strength = materials.concreteDefaultMPa[standardId][prestressed ? 'box' : 'slab'];
  const grade = concrete(standardId, strength);
  const members = nodes.slice(1).map((_, i) => [i, i + 1] as const);
  const memberM = Float64Array.from(members, ([i, j]) =>
    Math.hypot(nodes[j]![0] - nodes[i]![0], nodes[j]![1] - nodes[i]![1]),
  );
  const eKNm2 = grade.ecmMPa * 1e3;
  // The piece of a wall inside the depth of the deck goes on as the wall.
  const mean = (pick: (node: number) => number): Float64Array =>
    Float64Array.from(members, ([i, j]) =>
      i === knees[0] - 1 ? pick(i) : j === knees[1] + 1 ? pick(j) : (pick(i) + pick(j)) / 2,
    );
  const area = mean((i) => sections[i]!.areaM2);
  const inertia = mean((i) => sections[i]!.inertiaM4);
  const deckNodes = range(knees[0], knees[1]);
  const gamma = standard.unitWeights.concreteKNm3;
  const widthM = deck.widthM;
  const n = nodes.length;

  const inDeck = Float64Array.from(members, ([i]) => (i >= knees[0] && i < knees[1] ? 1 : 0));
  const levelM = Float64Array.from(members, ([i, j]) => Math.abs(nodes[j]![0] - nodes[i]![0]));
  const ownKN = Float64Array.from(members, ([i, j], e) => {
    if (inDeck[e]) return gamma * area[e]! * levelM[e]!;
    const knee = i === knees[0] - 1 ? j : j === knees[1] + 1 ? i : -1;
    // Of the block over a wall its outer half: the inner is the end of the deck.
    return gamma * (knee < 0 ? area[e]! * memberM[e]! : sections[knee]!.areaM2 * (shape.legTopM / 2));
  });
  const superimposedKN = inDeck.map((one, e) => one * deck.superimposedKNm * levelM[e]!);

  const caseOf = (feet: FrameOnFeet['feet']): FrameOnFeet => {
    const { lengthOverHeight, leastLengthM, stiffKNm3, softKNm3 } = portalData.foot;
    const frame = planeFrame({
      nodes,
      members,
      eaKN: area.map((a) => eKNm2 * a),
      eiKNm2: inertia.map((i) => eKNm2 * i),
      feet: ([0, 1] as const).map((end) => {
        const lengthM = Math.max(leastLengthM, lengthOverHeight * shape.heightM[end]);
        const soil = feet === 'stiff' ? stiffKNm3 : softKNm3;
        return {
          node: end === 0 ? 0 : n - 1,
          alongKNPerM: soil * lengthM * widthM,
          upKNPerM: Infinity,
          turnKNm: feet === 'stiff' ? (soil * widthM * lengthM ** 3) / 12 : 0,
        };
      }),
    });
    const middle = (knees[0] + knees[1]) >> 1;
    const run = (load: FrameLoad): ChainEffects => chain(frameEffects(frame, load), beside, middle);
    const down = (forces: Iterable<readonly [node: number, kN: number]>): ChainEffects => {
      const nodal = new Float64Array(3 * n);
      for (const [node, kN] of forces) nodal[3 * node + 1]! -= kN;
      return run({ nodal });
    };
    const pushed = (ends: readonly (0 | 1)[], kPa: (depthM: number, heightM: number) => number) => {
      const nodal = new Float64Array(3 * n);
      for (const end of ends) {
        const wall = wallNodes(shape, end);
        const height = shape.heightM[end];
        const forces = pressureOnNodes(
          wall.map((i) => -nodes[i]![1]),
          widthM,
          (depth) => kPa(depth, height),
        );
        // What presses on the end of the deck itself goes into it at once.
        const endKN = widthM * shape.kneeM * ((kPa(0, height) + kPa(shape.kneeM, height)) / 2);
        wall.forEach((i, k) => {
          nodal[3 * i]! += (end === 0 ? 1 : -1) * forces[k]!;
        });
        nodal[3 * knees[end]]! += (end === 0 ? 1 : -1) * endKN;
      }
      return run({ nodal });
    };
    const { earth, temperature } = portalData;
    const rangeM =
      (temperature.expansion1PerK * (temperature.warmerK + temperature.colderK) * shape.spanM) / 2;
    const pressure = ratchetPressure(
      Math.min(...shape.heightM),
      rangeM,
      feet === 'stiff' ? earth.stiffFactor : earth.softFactor,
    );
    const surchargeKPa = earth.restPressure * earth.surchargeKPa;
    const braked = new Float64Array(3 * n);
    braked[3 * middle] = 1;
    return {
      feet,
      own: down(halves(ownKN)),
      superimposed: down(halves(superimposedKN)),
      earth: pushed([0, 1], (depth) => earth.fillKNm3 * depth),
      pressedEarth: pushed([0, 1], (depth, height) =>
        pressureAt(depth, height, { upper: pressure, foot: earth.restPressure }),
      ),
      pressure,
      surcharge: [pushed([0], () => surchargeKPa), pushed([1], () => surchargeKPa)],
      braking: run({ nodal: braked }),
      longer: run({ strain: inDeck.map((one) => one * 1e-5) }),
      topWarmer: run({
        curvature1PerM: inDeck.map(
          (one, e) =>
            (-one * temperature.expansion1PerK * 2) / (sections[e]!.depthM + sections[e + 1]!.depthM),
        ),
      }),
      unit: deckNodes.map((node) => down([[node, 1]])),
      run,
    };
  };
  // Of a deck node the members on both sides, of a wall node the one over it.
  const beside = Array.from({ length: n }, (_, i): readonly [number, number] =>
    i > knees[0] && i < knees[1] ? [i - 1, i] : i < knees[1] ? [i, i] : [i - 1, i - 1],
  );
  return {
    task,
    standardId,
    standard,
    concrete: grade,
    prestressed,
    shape,
    memberM,
    deckNodes,
    deckXM: Float64Array.from(deckNodes, (i) => nodes[i]![0]),
    designNodes: [...wallNodes(shape, 0), ...range(knees[0] + 1, knees[1] - 1), ...wallNodes(shape, 1)],
    deckM3: deckVolume(shape),
    wallM3: [0, 1].map(
      (end) => ((shape.legTopM + shape.legFootM) / 2) * (shape.heightM[end]! - shape.kneeM) * widthM,
    ) as [number, number],
    cases: [caseOf('stiff'), caseOf('soft')],
  };
}

/** Nodes of a wall from its foot or soffit on, in the order of the chain. */
export function wallNodes({ knees, nodes }: FrameShape, end: 0 | 1): number[] {
  return end === 0 ? range(0, knees[0] - 1) : range(knees[1] + 1, nodes.length - 1);
}

const range = (from: number, to: number): number[] =>
  Array.from({ length: to - from + 1 }, (_, i) => from + i);

/** Concrete of the deck to the outer faces of the walls, m3. */
function deckVolume({ nodes, sections, knees, legTopM }: FrameShape): number {
  let sum = (legTopM / 2) * (sections[knees[0]]!.areaM2 + sections[knees[1]]!.areaM2);
  for (let i = knees[0]; i < knees[1]; i++)
    sum += ((sections[i]!.areaM2 + sections[i + 1]!.areaM2) / 2) * (nodes[i + 1]![0] - nodes[i]![0]);
  return sum;
}

/** Half of what each member weighs on either of its nodes, kN. */
function* halves(weightKN: Float64Array): Iterable<readonly [node: number, kN: number]> {
  for (const [e, weight] of weightKN.entries()) {
    yield [e, weight / 2];
    yield [e + 1, weight / 2];
  }
}

function chain(
  effects: FrameEffects,
  beside: readonly (readonly [number, number])[],
  middle: number,
): ChainEffects {
  const { startKNm, endKNm, normalKN, shearKN, moved, feet } = effects;
  const n = beside.length;
  const momentKNm = new Float64Array(n);
  const thrustKN = new Float64Array(n);
  for (let i = 0; i < n; i++) {
    momentKNm[i] = i < n - 1 ? startKNm[i]! : endKNm[i - 1]!;
    const [a, b] = beside[i]!;
    thrustKN[i] = -(normalKN[a]! + normalKN[b]!) / 2;
  }
  const [first, last] = feet;
  return {
    momentKNm,
    thrustKN,
    shearKN,
    feet: [
      { verticalKN: first![1], alongKN: -first![0], momentKNm: first![2] },
      { verticalKN: last![1], alongKN: last![0], momentKNm: -last![2] },
    ],
    middleM: -moved[3 * middle + 1]!,
  };
}
