export { drawDrivers, optionError, type Draws } from './drawDrivers.ts';
export { drawRate, drawRates, type RateDraws } from './drawRates.ts';
export { driverData, driverIds, type DriverId } from './drivers.ts';
export { priceOption, type Priceable, type PricedOption } from './priceOption.ts';
export { meanRates, ratePacks, ratesFor, type Rate, type RatePack, type Rates } from './rates.ts';
