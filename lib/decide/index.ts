export type { Contender } from './contender.ts';
export { stand } from './stand.ts';
