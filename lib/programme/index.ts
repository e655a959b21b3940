export { planProgramme, type Activity, type Programme } from './planProgramme.ts';
