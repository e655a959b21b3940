/**
 * What is asked of the worked examples as a whole. Each takes seconds to work out and files may run in processes of their
 * own: in one file it is worked out once.
 */
import './appraise/examplesOpen.ts';
import './drawings/keptClear.ts';
import './drawings/measured.ts';
