import type { TrafficLoad } from '../../actions/index.ts';
import type { Design } from '../../model/index.ts';

/** What a design says of its obtuse corners: what its traffic was sized with, nothing on a square deck. */
export const obtuseOf = ({ obtuse }: Pick<TrafficLoad, 'obtuse'>): Pick<Design, 'obtuseCorner'> =>
  obtuse === undefined ? {} : { obtuseCorner: obtuse };
