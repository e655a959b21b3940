import type { Descriptor } from '../../model/index.ts';
import type { formManual } from '../common/formManual.ts';

/** What a box has besides the usual concrete, in the manual of one of them. */
export const concreteFigures = ({ sized }: ReturnType<typeof formManual>): readonly Descriptor[] => [
  sized('concreteStrengthMPa', 'strength of the concrete', 'MPa', 'as given', './task/strengthMPa'),
  sized(
    'lightM3',
    'lightweight concrete',
    'm3',
    'area of the section along the middles of spans that are made of it',
    'areaM2',
    'spans',
    './task/light/densityKgM3',
  ),
  sized(
    'lightWeightKNm3',
    'weight of the lightweight concrete with its bars',
    'kN/m3',
    '9.81 (oven-dry density + bars) / 1000',
    './task/light/densityKgM3',
    'data/materials/lightConcrete/:standard/reinforcedMoreKgM3',
  ),
  sized(
    'lightModulusMPa',
    'modulus of the lightweight concrete',
    'MPa',
    'modulus of ordinary concrete x (density / density of ordinary concrete) to a power: eta_E of EN 1992-1-1 11.3.2, w^1.5 of AASHTO LRFD 5.4.2.4 (from memory)',
    './task/light/densityKgM3',
    'data/materials/lightConcrete/:standard/stiffnessPower',
  ),
  sized(
    'lightShearShare',
    'shear of the lightweight concrete against ordinary concrete',
    '1',
    '0.5 eta_1 / 0.6, eta_1 = 0.4 + 0.6 density / 2200 (EN 1992-1-1 11.6.2), or lambda (AASHTO LRFD 5.4.2.8), from memory',
    './task/light/densityKgM3',
    'data/materials/lightConcrete/:standard/tensionFixed',
    'data/materials/lightConcrete/:standard/strutShare',
  ),
  sized('ballastKN', 'ballast in the cells', 'kN', 'sum of load of a span x its length', 'ballast', 'spans'),
];
