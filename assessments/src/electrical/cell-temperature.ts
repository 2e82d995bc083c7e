import { within } from './out-of-range.ts';

/** Light and air temperature at which a panel's nominal operating cell temperature is found. */
const NOCT_LIGHT_W_PER_M2 = 800;
const NOCT_AIR_C = 20;
/** Light and cell temperature a panel is rated at (IEC 60904-3, from memory). */
const RATED_LIGHT_W_PER_M2 = 1000;
const RATED_C = 25;

const LIGHT = {
  what: 'Irradiance',
  unit: 'W/m²',
  least: 0,
  most: 1500,
  remedy: 'full sun is about 1000 W/m²',
};

/**
 * Temperature of the cells of a panel in an open rack, °C.
 *
 * Source: conditions of the nominal operating cell temperature (NOCT) from an engineering
 * dictionary (read); the straight line through them from memory. A panel flat on a roof runs
 * hotter.
 *
 * @throws {OutOfRange} when light, air or NOCT are beyond a panel's life.
 * @example cellTemperatureC({ airC: 25, noctC: 45, lightWPerM2: 1000 }) // 56.25
 */
export function cellTemperatureC(panel: {
  airC: number;
  noctC: number;
  lightWPerM2: number;
}): number {
  within(panel.airC, {
    what: 'Air temperature',
    unit: '°C',
    least: -40,
    most: 60,
    remedy: 'give the shade temperature of the air',
  });
  within(panel.noctC, {
    what: 'NOCT',
    unit: '°C',
    least: 35,
    most: 60,
    remedy: 'read it off the panel’s data sheet; 43 to 48 °C is usual',
  });
  within(panel.lightWPerM2, LIGHT);
  return panel.airC + ((panel.noctC - NOCT_AIR_C) / NOCT_LIGHT_W_PER_M2) * panel.lightWPerM2;
}

/**
 * Power of a panel in such light at such a cell temperature, W: in proportion to the light, and
 * by the maker's coefficient away from 25 °C.
 *
 * @param panel - `percentPerK` is the power coefficient as printed, such as −0.40 %/K.
 * @throws {OutOfRange} when the light, the coefficient or the cell temperature are out of bounds.
 * @example panelWatts({ ratedW: 200, percentPerK: -0.4, cellC: 56.25, lightWPerM2: 1000 }) // 175
 */
export function panelWatts(panel: {
  ratedW: number;
  percentPerK: number;
  cellC: number;
  lightWPerM2: number;
}): number {
  within(panel.lightWPerM2, LIGHT);
  within(panel.ratedW, {
    what: 'Rated power',
    unit: 'W',
    least: 0,
    most: 10_000,
    remedy: 'read it off the label, at 1000 W/m² and 25 °C',
  });
  within(panel.percentPerK, {
    what: 'Power coefficient',
    unit: '%/K',
    least: -1,
    most: 0,
    remedy: 'give it as printed, in per cent for each kelvin',
  });
  within(panel.cellC, {
    what: 'Cell temperature',
    unit: '°C',
    least: -40,
    most: 100,
    remedy: 'give the temperature of the cells, not of the air',
  });
  const shareOfLight = panel.lightWPerM2 / RATED_LIGHT_W_PER_M2;
  return panel.ratedW * shareOfLight * (1 + (panel.percentPerK / 100) * (panel.cellC - RATED_C));
}
