export { evidence, evidenceFileNames, evidenceRows } from './evidence.ts';
export { evidenceCases } from './cases/index.ts';
export { runEvidence, type EvidenceLine } from './runEvidence.ts';
export { evidenceFile, evidenceRow, type EvidenceRow } from './evidenceRow.ts';
export { caseInputs, type CaseInputs, type EvidenceCase } from './caseInputs.ts';
