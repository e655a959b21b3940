import { concrete, loadStandard, materials } from '../../actions/index.ts';
import type { StandardId } from '../../model/index.ts';
import { barDesignMPa } from '../common/bars.ts';
import { check } from '../common/checks.ts';
import { barMass, type SlabDesign } from '../common/slab/designSlab.ts';
import type { SlabCase } from '../common/slab/slabCase.ts';
import { slabData } from '../common/slab/slabData.ts';
import { slabMoments, type SlabMoments } from '../common/slab/slabMoments.ts';
import { boxData } from './boxData.ts';

/** A top slab with tendons across the deck. */
export interface AcrossSlab extends SlabDesign {
  /** Strand of the tendons across, kg per m2 of deck. */
  readonly strandKgM2: number;
  /** Their lasting force, kN per m of deck. */
  readonly forceKNm: number;
}

/** Stress of a tendon across the deck in its middle, MPa: stressed from one end over the width, wedges drawn in. */
export function acrossStress(
  standard: StandardId,
  widthM: number,
  turnRad: number,
): { readonly initialMPa: number; readonly lastingMPa: number } {
  const { frictionPerRad, wobbleRadPerM, seatingM, longTerm } = boxData.losses;
  const { eMPa, ultimateMPa } = materials.strand[standard];
  const kept = Math.exp(-frictionPerRad * (turnRad / 2 + (wobbleRadPerM * widthM) / 2));
  const initialMPa = boxData.jacking[standard] * ultimateMPa * kept - (seatingM * eMPa) / widthM;
  return { initialMPa, lastingMPa: (1 - longTerm) * initialMPa };
}

/**
 * Lasting force per metre, kN, that keeps the pressed-open face of a slab of a thickness within the tension allowed under a
 * service moment and a tension in the slab, kN/m, with its axis as near to that face as cover allows. Negative where the slab needs none.
 */
export function acrossNeed(momentKNm: number, thicknessM: number, standard: StandardId, tieKNm = 0): number {
  const modulus = thicknessM ** 2 / 6;
  const e = thicknessM / 2 - boxData.across.axisM;
  const tension = boxData.serviceTensionMPa[standard] * 1e3;
  return (
    (momentKNm / modulus + tieKNm / thicknessM - tension) /
    (boxData.prestressSpread[standard] * (1 / thicknessM + e / modulus))
  );
}

/**
 * Designs a top slab with tendons across the deck: high over the webs and low between them, one force throughout. Slab as
 * thin as its clear span, the closest tendons and the pressure on the concrete allow; bars for what the strands do not
 * carry at ultimate. The parasitic moment of the tendons is left out.
 */
export function acrossSlab(slab: SlabCase): AcrossSlab {
  const { standard: id, spacingM, overhangM, deck } = slab;
  const { across, compression } = boxData;
  const standard = loadStandard(id);
  const { fckMPa, fctmMPa } = concrete(id, materials.concreteDefaultMPa[id].box);
  const { spanMoments, overhangMoments, innerRootMoments, edgeM } = slabMoments(slab);
  const { uls, sls } = standard.factors;
  const tie = slab.tie ?? { serviceKNm: 0, ultimateKNm: 0 };
  const lasting = (m: SlabMoments): number => m.permanent + m.superimposed;
  const service = (m: SlabMoments): number => lasting(m) + sls.vehicle * m.traffic;
  const ultimate = (m: SlabMoments): number =>
    uls.permanent * m.permanent + uls.superimposed * m.superimposed + uls.traffic * m.traffic;
  const rootOf = (t: number): SlabMoments => {
    const [outer, inner] = [overhangMoments(t), innerRootMoments(t)];
    return ultimate(outer) >= ultimate(inner) ? outer : inner;
  };

  const leastM = Math.max(
    slabData.leastThicknessM[id],
    (spacingM - boxData.webLeastM[id]) / across.clearOverThickness,
  );
  // The drape is that of a slab of the usual thickness: friction hardly feels it.
  const turnRad = (8 * leastM) / spacingM;
  const { initialMPa, lastingMPa } = acrossStress(id, deck.widthM, turnRad);
  const strandM2 = boxData.strandAreaMm2[id] * 1e-6;
  const mostKNm = (across.strandsPerTendon * strandM2 * lastingMPa * 1e3) / across.closestM;
  const pressed = (m: SlabMoments, t: number, forceKNm: number): number =>
    forceKNm / t + (lasting(m) + m.traffic - forceKNm * (t / 2 - across.axisM)) / (t ** 2 / 6);
  const thicknessFor = (from: number, momentsAt: (t: number) => SlabMoments): number => {
    const step = slabData.stepM.value;
    const bad = (t: number): boolean => {
      const need = acrossNeed(service(momentsAt(t)), t, id, tie.serviceKNm);
      return need > mostKNm || pressed(momentsAt(t), t, Math.max(0, need)) > compression.total * fckMPa * 1e3;
    };
    let t = Math.ceil(from / step - 1e-9) * step;
    while (t < across.mostThicknessM && bad(t)) t += step;
    return Number(t.toFixed(6));
  };
  const midM = thicknessFor(leastM, spanMoments);
  const rootM = thicknessFor(Math.max(midM, edgeM), rootOf);

  const places = [
    { id: 'slab-span', label: 'slab between its supports', moments: spanMoments(midM), thicknessM: midM },
    { id: 'slab-root', label: 'slab over its supports', moments: rootOf(rootM), thicknessM: rootM },
  ] as const;
  const forceKNm = Math.max(
    0,
    ...places.map(({ moments, thicknessM }) => acrossNeed(service(moments), thicknessM, id, tie.serviceKNm)),
  );
  const tendonM2 = forceKNm / (lastingMPa * 1e3);
  const startKNm = tendonM2 * initialMPa * 1e3;
  const carriedKN = (tendonM2 * materials.strand[id].proofMPa * 1e3) / standard.resistance.prestress;
  const [mid, root] = places.map(({ moments, thicknessM }) => {
    const leverM = slabData.leverRatio.value * (thicknessM - across.axisM);
    const restKN = ultimate(moments) / leverM + tie.ultimateKNm / 2 - carriedKN;
    return {
      areaM2: Math.max(0, restKN / (barDesignMPa(id) * 1e3)),
      effectiveM: thicknessM - slabData.barAxisM.value,
    };
  }) as [{ areaM2: number; effectiveM: number }, { areaM2: number; effectiveM: number }];
  const inside = deck.widthM - 2 * overhangM;
  const meanM = (inside * (midM + (rootM - midM) / 4) + overhangM * (rootM + edgeM)) / deck.widthM;
  // While it is stressed only the weight of the slab works against the tendons.
  const opened = places.map(
    ({ moments, thicknessM: t }) =>
      (startKNm * (t / 2 - across.axisM) - moments.permanent) / (t ** 2 / 6) - startKNm / t,
  );
  const ratioOf = ({ areaM2, effectiveM }: { areaM2: number; effectiveM: number }): number =>
    areaM2 / effectiveM;
  const most = slabData.steelRatioMost.value;
  return {
    midM,
    rootM,
    edgeM,
    meanM,
    ...barMass(inside / deck.widthM, mid, root, midM, rootM),
    spanMomentKNm: ultimate(places[0].moments),
    rootMomentKNm: ultimate(places[1].moments),
    strandKgM2: materials.steelDensityKgM3 * tendonM2 * boxData.strandSlack.value,
    forceKNm,
    checks: [
      check(
        'slab-span',
        'slab between its supports: bars within the practical ratio',
        ratioOf(mid),
        most,
        '1',
      ),
      check('slab-root', 'slab over its supports: bars within the practical ratio', ratioOf(root), most, '1'),
      check(
        'slab-thickness',
        'slab no thicker than practical',
        Math.max(midM, rootM),
        across.mostThicknessM,
        'm',
      ),
      check('slab-tendons', 'tendons across the deck: force within the closest', forceKNm, mostKNm, 'kN/m'),
      check(
        'slab-pressure',
        'slab pressed by tendons and traffic',
        Math.max(...places.map(({ moments, thicknessM }) => pressed(moments, thicknessM, forceKNm))) / 1e3,
        compression.total * fckMPa,
        'MPa',
      ),
      check(
        'slab-stressing',
        'slab while it is stressed across',
        Math.max(0, ...opened) / 1e3,
        fctmMPa,
        'MPa',
      ),
    ],
  };
}
