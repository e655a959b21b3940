import {
  beamTrack,
  lineAreas,
  lineBeam,
  momentInfluence,
  momentLine,
  runGroup,
  uniform,
  type LineAreas,
} from '../../mechanics/index.ts';
import type { EvidenceCase } from '../caseInputs.ts';
import { contraflexuresM, spanPeak } from './sharedBeam.ts';

/** Uniform load on given spans: support moments, greatest span moments and where, reactions, contraflexures. */
export const continuousBeam: EvidenceCase = (inputs) => {
  const spansM = inputs.numbers('spans');
  const beam = lineBeam({ spansM });
  const effects = uniform(beam, inputs.has('loads') ? inputs.numbers('loads') : inputs.numberOr('load', 1));
  const figures: Record<string, number> = {};
  beam.supportAt.forEach((s, j) => {
    figures[`supportMoment${j}`] = effects.momentKNm[s]!;
    figures[`reaction${j}`] = effects.reactionKN[j]!;
  });
  spansM.forEach((_, i) => {
    const peak = spanPeak(beam, effects.momentKNm, i);
    figures[`spanMoment${i}`] = peak.value;
    figures[`spanMomentAt${i}`] = peak.fromLeftM;
    contraflexuresM(beam, effects, i).forEach((x, k) => {
      figures[`contraflexure${i}.${k}`] = x;
    });
    const from = beam.supportAt[i]!;
    figures[`momentAt0.4Span${i}`] = effects.momentKNm[from + 8]!;
  });
  return figures;
};

/** Uniform load 1 where adverse only: greatest span moments, least support moments; least moment of a unit point load. */
export const patternedBeam: EvidenceCase = (inputs) => {
  const spansM = inputs.numbers('spans');
  const beam = lineBeam({ spansM });
  const areas: LineAreas = { positive: 0, negative: 0, positiveM: 0, negativeM: 0 };
  const most = new Float64Array(beam.xM.length);
  const least = new Float64Array(beam.xM.length);
  for (let s = 0; s < most.length; s++) {
    lineAreas(beam.xM, momentLine(beam, s), areas);
    most[s] = areas.positive;
    least[s] = areas.negative;
  }
  const figures: Record<string, number> = {};
  const point = { atM: [0], loadKN: [1], whole: true };
  const run = { max: 0, min: 0 };
  beam.supportAt.forEach((s, j) => {
    figures[`supportMoment${j}`] = least[s]!;
    runGroup(beamTrack(beam), point, momentLine(beam, s), s, run);
    figures[`supportMomentOfUnitLoad${j}`] = run.min;
  });
  spansM.forEach((_, i) => {
    figures[`spanMoment${i}`] = spanPeak(beam, most, i).value;
  });
  return figures;
};

/** Moment at a support or section of a unit load at tenths of every span: `span.tenth` figures. */
export const influenceOrdinates: EvidenceCase = (inputs) => {
  const spansM = inputs.numbers('spans');
  const beam = lineBeam({ spansM });
  const at = inputs.number('sectionM');
  const station = beam.xM.findIndex((x) => Math.abs(x - at) < 1e-9);
  const line = momentInfluence(beam, station);
  const figures: Record<string, number> = {};
  spansM.forEach((_, i) => {
    for (let tenth = 1; tenth < 10; tenth++) figures[`${i}.${tenth}`] = line[beam.supportAt[i]! + 2 * tenth]!;
  });
  const areas: LineAreas = { positive: 0, negative: 0, positiveM: 0, negativeM: 0 };
  lineAreas(beam.xM, momentLine(beam, station), areas);
  const run = { max: 0, min: 0 };
  runGroup(beamTrack(beam), { atM: [0], loadKN: [1], whole: true }, momentLine(beam, station), station, run);
  return { ...figures, least: run.min, negativeArea: areas.negative, positiveArea: areas.positive };
};
