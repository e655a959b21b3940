export { evidence, evidenceFileNames, evidenceRows } from './evidence.ts';
export { evidenceCases } from './cases/index.ts';
export { isUnexplained, runEvidence, type EvidenceLine } from './runEvidence.ts';
export { summary, type SubjectSummary } from './summary.ts';
export { kindSummaries, type Aim, type KindSummary } from './aims.ts';
export { type Agreement, type Worst } from './agreement.ts';
export { formsWithoutCase } from './formsWithoutCase.ts';
export {
  evidenceFile,
  evidenceKinds,
  evidenceRow,
  type EvidenceKind,
  type EvidenceRow,
} from './evidenceRow.ts';
export { caseInputs, type CaseInputs, type EvidenceCase } from './caseInputs.ts';
