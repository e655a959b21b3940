import type { LoadStandard } from '../../../actions/index.ts';

/** Weight of the heaviest vehicle of a standard with dynamic allowance, kN. */
export function heaviestVehicleKN(standard: LoadStandard): number {
  const weights = standard.vehicles.map((vehicle) =>
    vehicle.axles.reduce((sum, axle) => sum + axle.loadKN, 0),
  );
  return Math.max(...weights) * (1 + standard.dynamicAllowance);
}
