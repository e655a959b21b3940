export type { ArrangeRequest, ArrangeResult, Relaxation, Windows } from './request.ts';
