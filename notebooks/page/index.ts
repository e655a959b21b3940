export { sheet, type BarSpec, type HeadSpec, type PageSpec, type Sheet, type SheetOptions } from './sheet.ts';
export { supportsWords } from './heldWords.ts';
export { printUpright } from './paper.ts';
export { dayOf, dayWords } from './days.ts';
export { pagesFrom, type PageName } from './pages.ts';
export type { CellHost, CellSpec, Explained, Part, Room } from './cellHost.ts';
export type { LineSection } from './stationLines.ts';
export {
  studyStore,
  type EditWords,
  type Head,
  type History,
  type Slices,
  type StudyStore,
} from './store.ts';
export { fieldsOf, type FieldOptions, type FieldPlace, type Fields, type Made } from './fields.ts';
export { figureInput, type FigureInput } from './figureInput.ts';
export type { FigureSpec, Origin } from './figureSpec.ts';
export type { Figure, FigureRules, Limit } from './figureText.ts';
export type { ScaleMark } from './figureScale.ts';
export { choiceInput, type Choice, type ChoiceInput, type ChoiceSpec } from './choiceInput.ts';
export { wordsInput, type WordsInput, type WordsSpec } from './wordsInput.ts';
export { standing, type StandingSpec } from './standing.ts';
export { pushed } from './pushed.ts';
export { draggable, untilDragRests, whileDragged, type Drag, type DragAt } from './dragging.ts';
export { takeHold, type HandDesk } from './takeHold.ts';
export { whereFrom, type Ask, type WhereFrom } from './whereFrom.ts';
export { workedFigure } from './workedFigure.ts';
export { undoKeys, type Undoable } from './undoKeys.ts';
export { waysOn, type Way } from './refusal.ts';
export { getAt, isWithin, putAt, type Path } from './place.ts';
export { share } from './share.ts';
export {
  readTyped,
  fileName,
  savedWords,
  studyShelf,
  type LoadedStudy,
  type StoredStudy,
  type StudyCupboard,
  type StudyEntry,
  type StudyFormat,
  type StudyShelf,
  type TypedStudy,
} from './saving.ts';
export { deviceCupboard } from './cupboard.ts';
export { isOf, journal, type Journal, type Unsaved } from './journal.ts';
export { keeping, type Keeping, type KeepingSpec } from './keeping.ts';
export { idle, whenIdle } from './whenIdle.ts';
export { readOnly } from './readOnly.ts';
export { openFile, saveFile, textOf } from './files.ts';
