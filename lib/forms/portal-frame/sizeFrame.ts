import { cosineOfSkew } from '../../site/skew.ts';
import { barMassKg } from '../slab/barsAcross.ts';
import { barDesignMPa } from '../common/bars.ts';
import { slabData } from '../common/slab/slabData.ts';
import { slabDeckData } from '../slab/slabDeckData.ts';
import { frameBars, wallFaces, type FaceBars } from './frameBars.ts';
import type { FrameModel } from './frameModel.ts';
import { frameShear, type PartShear } from './frameShear.ts';
import { frameTendons, type FrameTendons } from './frameTendons.ts';
import { frameTraffic, type FrameTraffic } from './frameTraffic.ts';
import { portalData } from './portalData.ts';

/** A frame with its steel. */
export interface SizedFrame {
  readonly traffic: FrameTraffic;
  readonly tendons: FrameTendons | null;
  readonly faces: readonly FaceBars[];
  readonly shear: { readonly deck: PartShear; readonly walls: PartShear };
  readonly across: { readonly lowM2PerM: number; readonly highM2PerM: number; readonly fitsM2PerM: number };
  readonly deckBarsKg: {
    readonly soffit: number;
    readonly top: number;
    readonly across: number;
    readonly links: number;
    readonly details: number;
  };
  /** Bars of each wall: upright, level, links and details together. */
  readonly wallBarsKg: readonly { readonly upright: number; readonly level: number }[];
}

const moreStrands = 1.08;

/** Tendons by service, bars by what is left at the ultimate limit and by cracks, then shear and the bars across. */
export function sizeFrame(model: FrameModel): SizedFrame {
  const traffic = frameTraffic(model);
  let tendons = model.prestressed ? frameTendons(model, traffic) : null;
  let faces = frameBars(model, traffic, tendons);
  const deckUse = (): number => Math.max(faces[0]!.use, faces[1]!.use);
  while (tendons && tendons.strands < tendons.mostStrands && deckUse() > 1) {
    const more: FrameTendons = frameTendons(model, traffic, Math.ceil(tendons.strands * moreStrands));
    if (!(more.strands > tendons.strands)) break;
    tendons = more;
    faces = frameBars(model, traffic, tendons);
  }
  const shear = frameShear(model, traffic, tendons, faces);
  const across = barsAcross(model, traffic, faces[0]!, tendons);
  const { shape, task } = model;
  const lengthM = shape.lengthM + shape.legTopM;
  const volume = (id: FaceBars['id']): number => faces.find((face) => face.id === id)!.volumeM3;
  const detailsKgM3 = slabDeckData.surfaceBarsKgM3.value;
  const soffitM = task.deck.widthM - 2 * shape.wingM;
  const acrossM3 =
    (across.lowM2PerM * soffitM +
      across.highM2PerM * task.deck.widthM +
      2 * 2.5 * shape.wingM * Math.max(0, shape.wingBarsM2PerM - across.highM2PerM)) *
    lengthM;
  // On a skew the walls are longer than the deck is wide.
  const longer = 1 / cosineOfSkew(task.skewDeg ?? null);
  const wallBarsKg = shape.walls.map(({ name }, w) => {
    const [outer, inner] = wallFaces(name);
    const links = (longer * shear.walls.linksM3) / shape.walls.length;
    return {
      upright: longer * barMassKg(volume(outer) + volume(inner)),
      level:
        barMassKg(portalData.wallAcross.ratio * model.wallM3[w]! + links) + detailsKgM3 * model.wallM3[w]!,
    };
  });
  return {
    traffic,
    tendons,
    faces,
    shear,
    across,
    deckBarsKg: {
      soffit: barMassKg(volume('soffit')),
      top: barMassKg(volume('top')),
      across: barMassKg(acrossM3),
      links: barMassKg(shear.deck.linksM3),
      details: detailsKgM3 * model.deckM3,
    },
    wallBarsKg,
  };
}

/** Bars across the deck, m2/m: by the wheels (LM1) or as a share of the steel along (AASHTO), never less than a share of the bars along. */
function barsAcross(
  model: FrameModel,
  traffic: FrameTraffic,
  soffit: FaceBars,
  tendons: FrameTendons | null,
): SizedFrame['across'] {
  const { shape, standardId, standard, task } = model;
  const { acrossKNm } = traffic.strips;
  const { bars, acrossShare } = slabDeckData;
  const soffitM = task.deck.widthM - 2 * shape.wingM;
  const alongM2PerM = Math.max(...soffit.placedM2) / soffitM;
  const leverM = slabData.leverRatio.value * (shape.midspanM - slabData.barAxisM.value - 0.02);
  const least = slabData.steelRatioLeast.value * shape.midspanM;
  let need = slabData.distributionShare.value * alongM2PerM;
  if (acrossKNm === null) {
    const raised = tendons ? tendons.stress.lastingMPa / acrossShare.prestressMPa : 1;
    const share = Math.min(acrossShare.most, (acrossShare.perRootM / Math.sqrt(shape.spanM)) * raised);
    need = share * (alongM2PerM + (tendons ? tendons.areaM2 / soffitM : 0));
  } else
    need = Math.max(
      need,
      (standard.factors.uls.traffic * acrossKNm) / (leverM * barDesignMPa(standardId) * 1e3),
      acrossKNm / (leverM * slabData.serviceStressMPa[standardId] * 1e3),
    );
  const size = bars.sizesM[bars.sizesM.length - 2]!;
  return {
    lowM2PerM: Math.max(least, need),
    highM2PerM: least,
    fitsM2PerM: (Math.PI * size ** 2) / 4 / bars.closestM,
  };
}
