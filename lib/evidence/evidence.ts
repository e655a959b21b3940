import adjacentBox from '../../data/evidence/adjacent-box.json';
import cableStayed from '../../data/evidence/cable-stayed.json';
import cables from '../../data/evidence/cables.json';
import cantileverBox from '../../data/evidence/cantilever-box.json';
import compositeBox from '../../data/evidence/composite-box.json';
import compositeI from '../../data/evidence/composite-i.json';
import concreteBox from '../../data/evidence/concrete-box.json';
import loads from '../../data/evidence/loads.json';
import mechanics from '../../data/evidence/mechanics.json';
import precastI from '../../data/evidence/precast-i.json';
import precastTrough from '../../data/evidence/precast-trough.json';
import sections from '../../data/evidence/sections.json';
import slab from '../../data/evidence/slab.json';
import steelBox from '../../data/evidence/steel-box.json';
import truss from '../../data/evidence/truss.json';
import { evidenceCases } from './cases/index.ts';
import { evidenceFile, type EvidenceRow } from './evidenceRow.ts';
import { runEvidence, type EvidenceLine } from './runEvidence.ts';

/** Files of `data/evidence` by name; a new file is named here. */
const files: Readonly<Record<string, unknown>> = {
  mechanics,
  loads,
  sections,
  cables,
  slab,
  'precast-i': precastI,
  'precast-trough': precastTrough,
  'adjacent-box': adjacentBox,
  'composite-i': compositeI,
  'composite-box': compositeBox,
  'concrete-box': concreteBox,
  'cantilever-box': cantileverBox,
  'steel-box': steelBox,
  truss,
  'cable-stayed': cableStayed,
};

/** Names of the files read, with their ending. */
export function evidenceFileNames(): string[] {
  return Object.keys(files).map((name) => `${name}.json`);
}

/** All rows of `data/evidence`, checked. */
export function evidenceRows(): EvidenceRow[] {
  return Object.values(files).flatMap((file) => evidenceFile.parse(file).rows);
}

/** Every published value beside ours, worked out now. */
export function evidence(): EvidenceLine[] {
  return runEvidence(evidenceRows(), evidenceCases);
}
