import { spansOf } from '../appraise/askedTask.ts';
import type { Appraisal, AppraisedOption } from '../model/index.ts';
import { rounded } from './rounded.ts';

function optionJson(option: AppraisedOption): object {
  return {
    number: option.number,
    form: option.form,
    family: option.family,
    method: option.method,
    startM: option.startM,
    endM: option.endM,
    units: option.units.map((unit) => ({ form: unit.form, spans: spansOf(unit) })),
    spans: option.units.flatMap(spansOf),
    supports: option.supports.map(({ chainageM, kind, heightM }) => ({ chainageM, kind, heightM })),
    depthM: option.depthM,
    variant: option.variant,
    status: option.status,
    rulings: option.rulings,
    headroomSpareM: option.headroom?.spareM,
    road: option.profile,
    quantities: option.quantities,
    perM2: option.perM2,
    supportQuantities: option.supportQuantities,
    cost: option.cost,
    pricePerM2: option.pricePerM2,
    parts: option.parts,
    months: option.months,
    limitingCheck: option.limitingCheck.id,
    limitingUtilisation: option.limitingCheck.utilisation,
  };
}

/**
 * The appraisal as the command line prints it: plain JSON, figures at six significant places, dearest last.
 * @param unconfirmed names of the start values of its study that nobody has confirmed
 */
export function appraisalJson(appraisal: Appraisal, unconfirmed: readonly string[]): object {
  return rounded({
    study: appraisal.study,
    startValuesNotConfirmed: unconfirmed,
    options: appraisal.options.map(optionJson),
    currency: appraisal.currency,
    dropped: appraisal.dropped,
    droppedCounts: appraisal.droppedCounts,
    register: appraisal.register,
    retired: appraisal.retired,
    standing: appraisal.standing,
  });
}
