import { materials, serviceTraffic, trafficOnInfluence } from '../../actions/index.ts';
import type { Check } from '../../model/index.ts';
import { check } from '../common/checks.ts';
import { cableData } from './cableData.ts';
import { skewEndCheck } from './skewEnds.ts';
import type { SizedBridge } from './sizePlane.ts';
import { serviceMPa, stayRangeLimitMPa } from './sizeStays.ts';
import { deckPush } from './stayForces.ts';

/** Limit states of a cable-stayed unit. */
export function cableChecks(bridge: SizedBridge): Check[] {
  const { stays, layout, zones, girders, pylons, standard } = bridge;
  const checks: Check[] = [];
  const byStrength = (i: number): number =>
    (stays[i]!.permanentKN + stays[i]!.trafficMaxKN) / (stays[i]!.areaM2 * serviceMPa * 1000);
  const all = layout.stays.map((_, i) => i);
  const strongest = all.reduce((a, b) => (byStrength(b) > byStrength(a) ? b : a));
  const heaviest = stays[strongest]!;
  checks.push(
    check(
      'stay-strength',
      'stays under characteristic load',
      heaviest.permanentKN + heaviest.trafficMaxKN,
      heaviest.areaM2 * serviceMPa * 1000,
      'kN',
    ),
  );
  const limit = stayRangeLimitMPa(standard.id);
  const worstRange = (anchor: boolean): number =>
    Math.max(0, ...all.filter((i) => layout.stays[i]!.anchor === anchor).map((i) => stays[i]!.rangeMPa));
  checks.push(
    check('stay-fatigue', 'stays, stress range', worstRange(false), limit, 'MPa'),
    check('back-stay-fatigue', 'back-stays, stress range', worstRange(true), limit, 'MPa'),
  );
  const { uls } = standard.factors;
  const anchors = all.filter((i) => layout.stays[i]!.anchor && stays[i]!.permanentKN > 0);
  if (anchors.length > 0) {
    const worst = anchors.reduce((a, b) => (slackOf(bridge, b) > slackOf(bridge, a) ? b : a));
    checks.push(
      check(
        'back-stay-slack',
        'back-stays stay taut with traffic on the back span',
        -uls.traffic * stays[worst]!.trafficMinKN,
        uls.permanentFavourable * stays[worst]!.permanentKN,
        'kN',
      ),
    );
  }
  const girder = girders.reduce((a, b) => (b.utilisation > a.utilisation ? b : a));
  const zone = zones[girders.indexOf(girder)]!;
  const where =
    zone.fromM === 0
      ? 'by the pylon'
      : zone.side === 1
        ? 'in the span towards the end'
        : 'in the span towards the start';
  checks.push(
    check('edge-girder', `edge girder ${where}`, girder.utilisation, 1, '1'),
    check(
      'slab-compression',
      'slab pressed by the stays',
      Math.max(...girders.map((one) => one.slabUse)),
      1,
      '1',
    ),
    deckBuckling(bridge),
    ...bridge.floor.checks,
    ...skewEndCheck(bridge.endFloor),
  );
  const pylon = pylons.reduce((a, b) => (b.utilisation > a.utilisation ? b : a));
  checks.push(
    check('pylon', `pylon leg, ${pylon.governs}`, pylon.utilisation, 1, '1'),
    check(
      'deflection',
      'deflection of the main span under traffic',
      deflectionM(bridge),
      layout.mainSpanM * cableData.deflectionOverSpan.value,
      'm',
    ),
  );
  return checks;
}

function slackOf({ stays }: SizedBridge, i: number): number {
  return -stays[i]!.trafficMinKN / stays[i]!.permanentKN;
}

/**
 * Greatest deflection of the middle of the main span, m, under the traffic that deflections are judged by: the frequent
 * values of LM1, the design load of HL-93.
 */
export function deflectionM(bridge: SizedBridge): number {
  const { layout, model, track, traffic } = bridge;
  const [first, second] = layout.pylons;
  const longer = first!.xM >= layout.lengthM - first!.xM ? first!.xM / 2 : (first!.xM + layout.lengthM) / 2;
  const line = model.deflectionLine(
    model.stationAt(second ? (first!.xM + second.xM) / 2 : longer, first!.xM),
  );
  return trafficOnInfluence(traffic.standard === 'lm1' ? serviceTraffic(traffic) : traffic, track, line).max;
}

/**
 * Deck as a strut on its stays: Ncr = 2 root(EI k / s) (Engesser) at the stay where the design push comes nearest to it.
 */
function deckBuckling(bridge: SizedBridge): Check {
  const { layout, lasting, stays, standard, zones, girders, loadKNm, traffic } = bridge;
  const { uls } = standard.factors;
  const length = zones.reduce((sum, zone) => sum + zone.totalM, 0);
  const eiKNm2 = zones.reduce((sum, zone, z) => sum + zone.totalM * girders[z]!.eiKNm2, 0) / length;
  // Traffic pushes like lasting load does, in proportion of their loads per metre.
  const design = uls.permanent + (uls.traffic * (traffic.udlKNm + traffic.footwayKNm)) / loadKNm;
  let worst = check('deck-buckling', 'deck as a strut on its stays', 0, 1, 'kN');
  layout.stays.forEach((stay, i) => {
    if (stay.anchor) return;
    const springKNm2 =
      (((materials.stay.eMPa * 1000 * stays[i]!.areaM2) / stay.lengthM) * stay.sine ** 2) /
      layout.pylons[stay.pylon]!.spacingM;
    const reach = Math.abs(stay.deckM - layout.pylons[stay.pylon]!.xM);
    const push = design * deckPush(layout, lasting.stayKN, stay.pylon, stay.side, reach);
    const next = check(
      'deck-buckling',
      'deck as a strut on its stays',
      push,
      2 * Math.sqrt(eiKNm2 * springKNm2),
      'kN',
    );
    if (next.utilisation > worst.utilisation) worst = next;
  });
  return worst;
}
