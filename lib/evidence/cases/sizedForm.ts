import { formModule } from '../../forms/index.ts';
import {
  formIds,
  standardIds,
  type DeckStrip,
  type FormId,
  type StandardId,
  type UnitTask,
} from '../../model/index.ts';
import { deckSpec } from '../../site/index.ts';
import { perM2, splitQuantities } from '../../takeoff/index.ts';
import type { CaseInputs, EvidenceCase } from '../caseInputs.ts';

/**
 * A form sized by the pipeline's own module: quantities per m2 of deck, the figures of its design, and own weight share.
 * Inputs: form, spansM, widthM, carriagewayM, lanes, depthM; optional standard, girders, pierDepthM (parabolic haunch),
 * substringers (1 or 0), pylons, surfacingM, radiusM, deckPlateM; of concrete boxes boxWidthM, strengthMPa, lightKgM3 with
 * lightMiddleM, ballastKNm.
 */
export const sizedForm: EvidenceCase = (inputs) => {
  const form = oneOf<FormId>(inputs.text('form'), formIds);
  const module = formModule(form);
  const standard = oneOf<StandardId>(inputs.textOr('standard', 'lm1'), standardIds);
  const spansM = inputs.numbers('spansM');
  const deck = deckSpec(strips(inputs), inputs.numberOr('surfacingM', 0.09), standard);
  const design = module.size({
    form,
    spansM,
    deck,
    standard,
    planRadiusM: inputs.numberOr('radiusM', Infinity),
    method: module.methods[0],
    depthM: inputs.number('depthM'),
    ...(inputs.has('girders') ? { girders: inputs.number('girders') } : {}),
    ...(inputs.has('pierDepthM')
      ? { haunch: { pierDepthM: inputs.number('pierDepthM'), law: 'parabolic' as const } }
      : {}),
    ...(inputs.has('substringers') ? { substringers: inputs.number('substringers') === 1 } : {}),
    ...(inputs.has('deckPlateM') ? { deckPlateM: inputs.number('deckPlateM') } : {}),
    ...(inputs.has('pylons') ? { pylons: inputs.numbers('pylons') } : {}),
    ...boxChoices(inputs),
  });
  const deckAreaM2 = spansM.reduce((sum, span) => sum + span, 0) * deck.widthM;
  const { superstructure } = splitQuantities(design.lines);
  return {
    ...design.figures,
    supportDepthM: design.depthM.support,
    ...perM2(superstructure, deckAreaM2),
    ownWeightShare: design.ownWeightShare,
  };
};

/** What may be asked of a concrete box. */
function boxChoices(
  inputs: CaseInputs,
): Pick<UnitTask, 'boxWidthM' | 'strengthMPa' | 'light' | 'ballastKNm'> {
  return {
    ...(inputs.has('boxWidthM') ? { boxWidthM: inputs.number('boxWidthM') } : {}),
    ...(inputs.has('strengthMPa') ? { strengthMPa: inputs.number('strengthMPa') } : {}),
    ...(inputs.has('lightKgM3')
      ? { light: { densityKgM3: inputs.number('lightKgM3'), middleM: inputs.numbers('lightMiddleM') } }
      : {}),
    ...(inputs.has('ballastKNm') ? { ballastKNm: inputs.numbers('ballastKNm') } : {}),
  };
}

/** Lanes across the carriageway, a barrier strip on either side. */
function strips(inputs: CaseInputs): DeckStrip[] {
  const carriagewayM = inputs.number('carriagewayM');
  const lanes = inputs.number('lanes');
  const strip = (kind: DeckStrip['kind'], widthM: number): DeckStrip => ({
    kind,
    widthM,
    ultimateWidthM: widthM,
  });
  const edge = strip('barrier', (inputs.number('widthM') - carriagewayM) / 2);
  return [edge, ...Array.from({ length: lanes }, () => strip('lane', carriagewayM / lanes)), edge];
}

function oneOf<T extends string>(text: string, list: readonly T[]): T {
  const found = list.find((entry) => entry === text);
  if (!found) throw new RangeError(`expected one of ${list.join(', ')}, received ${text}`);
  return found;
}
