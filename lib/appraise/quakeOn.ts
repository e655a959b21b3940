import type { FormModule } from '../forms/formModule.ts';
import type { Site, UnitTask } from '../model/index.ts';
import { seismicLoad } from '../substructure/index.ts';

/** What an earthquake asks of a unit whose walls are in one with it: they hold it as piers of limited ductility would. */
export function quakeOn(
  site: Pick<Site, 'seismic'>,
  { wallsInOne }: Pick<FormModule, 'wallsInOne'>,
): Pick<UnitTask, 'quakeShare'> {
  const quakeShare = wallsInOne ? (seismicLoad(site)?.pierShare ?? 0) : 0;
  return quakeShare > 0 ? { quakeShare } : {};
}
