import { chainage, length, level } from '../format.ts';
import { choicesSaid } from '../forms/formChoices.ts';
import { formLooks } from '../forms/formLook.ts';
import type { AppraisedOption, Design, FormId, MethodId, Site } from '../model.ts';
import { spansOf, roadTop, structureTop } from './alongOption.ts';

/** Whether an option's main unit is deeper at its supports than at midspan. */
const isHaunched = (option: AppraisedOption): boolean => option.depthM.support > option.depthM.midspan + 0.05;

/** Whether a deck stands on walls in one with it, not on piers. */
export const onWalls = (designs: readonly Design[]): boolean =>
  designs.some(({ walls }) => walls !== undefined && walls.length > 0);

/** Methods that are not the usual one of any form, as they are said of an option. */
const madeBy: Partial<Record<MethodId, string>> = { launch: 'launched', 'float-in': 'floated in' };

/** Heading of an option: the form, how it is built where that is not usual, haunched where it is, and the form of its approaches where that is another. */
export function optionTitle(option: AppraisedOption): string {
  const look = formLooks[option.form];
  const haunchSaid =
    option.form === 'cantilever-box' || option.form === 'portal-frame' || option.form === 'extradosed';
  const approaches = new Set<FormId>(
    option.units
      .filter((unit) => unit.role === 'approach' && unit.form !== option.form)
      .map((unit) => unit.form),
  );
  const beside = [...approaches].map(
    (form) => `${formLooks[form].short.charAt(0).toLowerCase()}${formLooks[form].short.slice(1)} approaches`,
  );
  const { [option.method]: method } = madeBy;
  return [
    look.name,
    ...(method === undefined ? [] : [method]),
    ...(isHaunched(option) && !haunchSaid ? ['haunched'] : []),
    ...beside,
  ].join(', ');
}

/** The form alone, short where it is also said how it is built. */
export const formBuilt = ({ form, method }: Pick<AppraisedOption, 'form' | 'method'>): string => {
  const { name, short } = formLooks[form];
  return method in madeBy ? `${short}, ${madeBy[method]}` : (name.split(', ')[0] ?? name);
};

/** The heading where there is little room: the form, with how it is built or else the first that is said of it. */
export const shortTitle = (option: AppraisedOption): string =>
  option.method in madeBy ? formBuilt(option) : optionTitle(option).split(', ').slice(0, 2).join(', ');

/** What is worth knowing of an option beside its spans: its depth, what stands above the road, how the road moves. */
export function optionNote(site: Site, option: AppraisedOption): string {
  const { support, midspan } = option.depthM;
  const depth = isHaunched(option)
    ? `${level(midspan)} m at midspan, ${level(support)} m at ${onWalls(option.designs) ? 'walls' : 'piers'}`
    : `${level(midspan)} m deep`;
  const { haunchRatio: _depthsSayIt, ...variant } = option.variant ?? {};
  const made = choicesSaid(variant)
    .map((words) => `, ${words}`)
    .join('');
  const above = structureTop(site, option) - roadTop(site, option);
  const tall = above > 4 ? `, ${length(Math.round(above))} m above the road` : '';
  const rise = Math.max(option.profile.startRiseM, option.profile.endRiseM);
  const moved =
    rise > 0.005 ? `; road ${level(rise)} m higher` : rise < -0.005 ? `; road ${level(-rise)} m lower` : '';
  const from =
    option.startM === undefined || option.endM === undefined
      ? ''
      : `${length(option.endM - option.startM)} m long from ${chainage(option.startM)} to ${chainage(option.endM)}, `;
  return `${from}${depth}${made}${tall}${moved}`;
}

/** Index of the longest span, which is printed bold. */
export const mainSpan = (option: AppraisedOption): number => {
  const spans = spansOf(option);
  return spans.indexOf(Math.max(...spans));
};
