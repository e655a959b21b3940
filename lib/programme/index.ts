export { programmeData } from './data.ts';
export { planProgramme, type Activity, type Programme } from './planProgramme.ts';
export { supportWeeks } from './supportWeeks.ts';
