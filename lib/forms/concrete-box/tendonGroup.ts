import { boxData } from './boxData.ts';

/** Tendons of one web: size, number and the room they take at a high or low point. */
export interface TendonGroup {
  readonly tendonsPerWeb: number;
  readonly strandsPerTendon: number;
  readonly ductM: number;
  /** Height over the ducts at a high or low point, m. */
  readonly heightM: number;
  /** From the concrete face to the middle of the group, m. */
  readonly fromFaceM: number;
}

/** The smallest tendon with which a web has the usual number or fewer, strands shared out evenly. */
export function tendonGroup(strandsPerWeb: number): TendonGroup {
  const { tendonRows, ductCoverM } = boxData;
  const { sizes } = boxData.tendons;
  const largest = sizes[sizes.length - 1]!;
  const size = sizes.find(({ strands }) => strands * tendonRows.usualPerWeb >= strandsPerWeb) ?? largest;
  const tendonsPerWeb = Math.max(1, Math.ceil(strandsPerWeb / size.strands));
  const rows = Math.ceil(tendonsPerWeb / tendonRows.abreast);
  const heightM = rows * size.ductM + (rows - 1) * tendonRows.gapM;
  return {
    tendonsPerWeb,
    strandsPerTendon: strandsPerWeb / tendonsPerWeb,
    ductM: size.ductM,
    heightM,
    fromFaceM: ductCoverM.value + heightM / 2,
  };
}
