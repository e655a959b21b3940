import { concrete, loadStandard, materials, type Concrete, type LoadStandard } from '../../actions/index.ts';
import { frameEffects, planeFrame, type FrameEffects, type FrameLoad } from '../../mechanics/index.ts';
import type { StandardId, UnitTask, WallLoad } from '../../model/index.ts';
import { cosineOfSkew } from '../../site/skew.ts';
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
  /** On the footings: downwards, towards the span, moment that turns it towards the span; of a middle wall towards the last. */
  readonly feet: readonly WallLoad[];
  /** Downwards at the middle of each span, m. */
  readonly middlesM: readonly number[];
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
  /** All permanent weight of deck and walls turned along the road, towards the end of the deck. */
  readonly weightAlong: ChainEffects;
  /** 1 kN along the deck, towards its end. */
  readonly braking: ChainEffects;
  /** Each strike on its wall: its force along, towards the end of the deck. */
  readonly strikes: readonly (readonly ChainEffects[])[];
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
  /** Members: their nodes and length, m. Those of the chain start at the node of their number. */
  readonly members: readonly (readonly [number, number])[];
  readonly memberM: Float64Array;
  /** Nodes of the deck, axis to axis, and their x, m. */
  readonly deckNodes: readonly number[];
  readonly deckXM: Float64Array;
  readonly deckM3: number;
  /** Of each wall. */
  readonly wallM3: readonly number[];
  readonly cases: readonly FrameOnFeet[];
}

/** Lays out a frame and works out every action on stiff and on soft feet. */
export function frameModel(task: UnitTask): FrameModel {
  const { standard: standardId, deck, spansM } = task;
  const standard = loadStandard(standardId);
  const shape = frameShape(task);
  const { nodes, sections, knees, walls, middles, chainNodes } = shape;
  const prestressed = Math.max(...spansM) > portalData.reinforced.mostSpanM;
  const strength = materials.concreteDefaultMPa[standardId][prestressed ? 'box' : 'slab'];
  const grade = concrete(standardId, strength);
  const middle = walls.find(({ name }) => name === 'middle');
  const members = nodes.slice(1).map((_, e): readonly [number, number] => {
    if (e < chainNodes - 1) return [e, e + 1];
    return [e + 1, e + 2 < nodes.length ? e + 2 : middle!.knee];
  });
  const inMiddleBlock = (i: number, j: number): boolean => i >= chainNodes && j < chainNodes;
  const memberM = Float64Array.from(members, ([i, j]) =>
    Math.hypot(nodes[j]![0] - nodes[i]![0], nodes[j]![1] - nodes[i]![1]),
  );
  const eKNm2 = grade.ecmMPa * 1e3;
  // The piece of a wall inside the depth of the deck goes on as the wall.
  const mean = (pick: (node: number) => number): Float64Array =>
    Float64Array.from(members, ([i, j]) =>
      i === knees[0] - 1 || inMiddleBlock(i, j)
        ? pick(i)
        : j === knees[1] + 1
          ? pick(j)
          : (pick(i) + pick(j)) / 2,
    );
  const area = mean((i) => sections[i]!.areaM2);
  const inertia = mean((i) => sections[i]!.inertiaM4);
  const deckNodes = range(knees[0], knees[1]);
  const gamma = standard.unitWeights.concreteKNm3;
  const widthM = deck.widthM;
  // Walls stand along the line of supports; the plane frame is that of a square deck of the spans along the road.
  const wallM = widthM / cosineOfSkew(task.skewDeg ?? null);
  const n = nodes.length;

  const inDeck = Float64Array.from(members, ([i]) => (i >= knees[0] && i < knees[1] ? 1 : 0));
  const levelM = Float64Array.from(members, ([i, j]) => Math.abs(nodes[j]![0] - nodes[i]![0]));
  const ownKN = Float64Array.from(members, ([i, j], e) => {
    if (inDeck[e]) return gamma * area[e]! * levelM[e]!;
    // The deck goes through over a wall in the middle.
    if (inMiddleBlock(i, j)) return 0;
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
      feet: walls.map(({ heightM, foot }) => {
        const lengthM = Math.max(leastLengthM, lengthOverHeight * heightM);
        const soil = feet === 'stiff' ? stiffKNm3 : softKNm3;
        return {
          node: foot,
          alongKNPerM: soil * lengthM * widthM,
          upKNPerM: Infinity,
          turnKNm: feet === 'stiff' ? (soil * widthM * lengthM ** 3) / 12 : 0,
        };
      }),
    });
    const run = (load: FrameLoad): ChainEffects => chain(frameEffects(frame, load), beside, shape);
    const down = (forces: Iterable<readonly [node: number, kN: number]>): ChainEffects => {
      const nodal = new Float64Array(3 * n);
      for (const [node, kN] of forces) nodal[3 * node + 1]! -= kN;
      return run({ nodal });
    };
    const pushed = (ends: readonly (0 | 1)[], kPa: (depthM: number, heightM: number) => number) => {
      const nodal = new Float64Array(3 * n);
      for (const end of ends) {
        const { nodes: wall, heightM: height } = end === 0 ? walls[0]! : walls[walls.length - 1]!;
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
      (temperature.expansion1PerK * (temperature.warmerK + temperature.colderK) * shape.lengthM) / 2;
    const pressure = ratchetPressure(
      Math.min(walls[0]!.heightM, walls[walls.length - 1]!.heightM),
      rangeM,
      feet === 'stiff' ? earth.stiffFactor : earth.softFactor,
    );
    const surchargeKPa = earth.restPressure * earth.surchargeKPa;
    const along = (forces: Iterable<readonly [node: number, kN: number]>): ChainEffects => {
      const nodal = new Float64Array(3 * n);
      for (const [node, kN] of forces) nodal[3 * node]! += kN;
      return run({ nodal });
    };
    return {
      feet,
      own: down(halves(ownKN, members)),
      superimposed: down(halves(superimposedKN, members)),
      earth: pushed([0, 1], (depth) => earth.fillKNm3 * depth),
      pressedEarth: pushed([0, 1], (depth, height) =>
        pressureAt(depth, height, { upper: pressure, foot: earth.restPressure }),
      ),
      pressure,
      surcharge: [pushed([0], () => surchargeKPa), pushed([1], () => surchargeKPa)],
      weightAlong: along([...halves(ownKN, members), ...halves(superimposedKN, members)]),
      braking: along([[middles[0]!, 1]]),
      strikes: walls.map(({ struck }, w) =>
        struck.map((node, k) => along([[node, task.strikes![w]![k]!.alongKN]])),
      ),
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
  // Of a deck node the members on both sides, of a wall node the one over it; behind the chain members start a node later.
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
    members,
    memberM,
    deckNodes,
    deckXM: Float64Array.from(deckNodes, (i) => nodes[i]![0]),
    deckM3: deckVolume(shape),
    wallM3: walls.map(({ topM, footM, heightM }) => ((topM + footM) / 2) * (heightM - shape.kneeM) * wallM),
    cases: [caseOf('stiff'), caseOf('soft')],
  };
}

/** Nodes at which the deck is designed: from face to face of the walls. */
export function deckDesignNodes({ knees, walls }: FrameShape): number[] {
  return range(knees[0] + 1, knees[1] - 1).filter((node) => walls.every(({ knee }) => knee !== node));
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
function* halves(
  weightKN: Float64Array,
  members: FrameModel['members'],
): Iterable<readonly [node: number, kN: number]> {
  for (const [e, weight] of weightKN.entries()) {
    yield [members[e]![0], weight / 2];
    yield [members[e]![1], weight / 2];
  }
}

function chain(
  effects: FrameEffects,
  beside: readonly (readonly [number, number])[],
  { chainNodes, walls, middles }: FrameShape,
): ChainEffects {
  const { startKNm, endKNm, normalKN, shearKN, moved, feet } = effects;
  const n = beside.length;
  const momentKNm = new Float64Array(n);
  const thrustKN = new Float64Array(n);
  for (let i = 0; i < n; i++) {
    momentKNm[i] =
      i < chainNodes - 1 ? startKNm[i]! : i === chainNodes - 1 ? endKNm[i - 1]! : startKNm[i - 1]!;
    const [a, b] = beside[i]!;
    thrustKN[i] = -(normalKN[a]! + normalKN[b]!) / 2;
  }
  return {
    momentKNm,
    thrustKN,
    shearKN,
    feet: walls.map(({ name }, w) => {
      const [alongKN, verticalKN, momentKNm] = feet[w]!;
      return name === 'last'
        ? { verticalKN, alongKN, momentKNm: -momentKNm }
        : { verticalKN, alongKN: -alongKN, momentKNm };
    }),
    middlesM: middles.map((node) => -moved[3 * node + 1]!),
  };
}
