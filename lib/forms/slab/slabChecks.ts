import type { Check } from '../../model/index.ts';
import { check } from '../common/checks.ts';
import type { StressUse } from '../concrete-box/boxStress.ts';
import { peakStation, type SizedSlab } from './sizeSlab.ts';
import { deflectionChecks } from './slabDeflection.ts';
import type { SlabModel } from './slabModel.ts';

/** All limit states of a sized slab; labels as they are printed. */
export function slabChecks(model: SlabModel, slab: SizedSlab): Check[] {
  const { low, high, tendons, compressions, across, shear } = slab;
  const continuous = model.task.spansM.length > 1;
  const checks: Check[] = [
    check(
      'bending-spans',
      'bending in the spans with the bars that fit',
      low.designKNm[peakStation(low)]!,
      slab.lowCapacityKNm,
      'kNm',
    ),
    check(
      'bars-spans',
      'bars in the soffit that fit',
      low.peakM2 / low.widthM,
      low.fitsM2 / low.widthM,
      'm2/m',
    ),
  ];
  if (continuous)
    checks.push(
      check(
        'bending-piers',
        'bending over the piers with the bars that fit',
        high.designKNm[peakStation(high)]!,
        slab.highCapacityKNm,
        'kNm',
      ),
      check(
        'bars-piers',
        'bars in the top that fit',
        high.peakM2 / high.widthM,
        high.fitsM2 / high.widthM,
        'm2/m',
      ),
    );
  if (tendons && compressions) {
    checks.push(
      check(
        'service-tension',
        model.standardId === 'lm1'
          ? 'frequent service: compressed round the tendons, faces uncracked'
          : 'tension of the concrete in service',
        tendons.needKN,
        tendons.forceKN,
        'kN of tendon force',
      ),
      check(
        'tendon-room',
        'strands that the slab has room for',
        tendons.strands,
        tendons.mostStrands,
        'strands',
      ),
      stress('compression-spans', 'compression of the soffit in the spans', compressions.spanSoffit),
      ...(continuous
        ? [stress('compression-piers', 'compression of the soffit at the piers', compressions.pierSoffit)]
        : []),
      stress('compression-top', 'compression of the top', compressions.top),
      stress('stressing', 'tension of the concrete on the day of stressing', compressions.freshTension),
    );
  }
  checks.push(
    check(
      'shear',
      'shear, with links where the concrete alone is not enough',
      shear.demandKN,
      shear.capacityKN,
      'kN',
    ),
    check('bars-across', 'bars across for the wheels that fit', across.lowM2PerM, across.fitsM2PerM, 'm2/m'),
  );
  if (slab.punching)
    checks.push(
      check(
        'punching',
        'punching over the bearings of the piers',
        slab.punching.demandKN,
        slab.punching.capacityKN,
        'kN',
      ),
    );
  return [...checks, ...deflectionChecks(model, low, slab.lowPlaced)];
}

function stress(id: string, label: string, { stressMPa, limitMPa }: StressUse): Check {
  return check(id, label, stressMPa, limitMPa, 'MPa');
}
