import { exampleNamed } from '../exampleNames.ts';
import { comingAnswer } from '../worked/comingAnswer.ts';

const query = new URLSearchParams(location.search);
// What came with the pages is asked for before all else: it arrives while the rest of the page is read. What does not come
// is worked out.
const coming = query.has('study') ? null : comingAnswer(exampleNamed(query.get('example'))).catch(() => null);
const { openPage } = await import('./openPage.ts');
await openPage(coming);
