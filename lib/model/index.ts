export * from './ids.ts';
export * from './study.ts';
export * from './site.ts';
export * from './design.ts';
export * from './option.ts';
export * from './ruling.ts';
export * from './problem.ts';
export * from './appraisal.ts';
