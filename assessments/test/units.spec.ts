import { execFileSync } from 'node:child_process';
import { describe, expect, it } from 'vitest';
import { parseUnit } from '../src/questions/unit-expression.ts';
import { readQuantity } from '../src/questions/quantity.ts';
import { BASE_UNITS, toSi } from '../src/questions/units.ts';

/**
 * Every unit of the table against GNU units, the general-purpose converter of the operating
 * system: [ours, theirs, SI base it is compared in].
 */
const UNITS: [string, string, string][] = [
  ['V', 'volt', 'kg m^2 s^-3 A^-1'],
  ['mV', 'millivolt', 'volt'],
  ['µV', 'microvolt', 'volt'],
  ['kV', 'kilovolt', 'volt'],
  ['A', 'ampere', 'A'],
  ['mA', 'milliampere', 'A'],
  ['µA', 'microampere', 'A'],
  ['kA', 'kiloampere', 'A'],
  ['Ω', 'ohm', 'kg m^2 s^-3 A^-2'],
  ['mΩ', 'milliohm', 'ohm'],
  ['µΩ', 'microohm', 'ohm'],
  ['kΩ', 'kiloohm', 'ohm'],
  ['MΩ', 'megaohm', 'ohm'],
  ['W', 'watt', 'kg m^2 s^-3'],
  ['mW', 'milliwatt', 'watt'],
  ['kW', 'kilowatt', 'watt'],
  ['Wh', 'watt hour', 'joule'],
  ['kWh', 'kilowatt hour', 'joule'],
  ['Ah', 'ampere hour', 'coulomb'],
  ['mAh', 'milliampere hour', 'coulomb'],
  ['N', 'newton', 'kg m s^-2'],
  ['kN', 'kilonewton', 'newton'],
  ['N·m', 'newton meter', 'joule'],
  ['kg', 'kilogram', 'kg'],
  ['g', 'gram', 'kg'],
  ['d', 'day', 's'],
  // A gauge is counted, not measured.
  ['AWG', '1', '1'],
  ['F', 'farad', 'kg^-1 m^-2 s^4 A^2'],
  ['mF', 'millifarad', 'farad'],
  ['µF', 'microfarad', 'farad'],
  ['nF', 'nanofarad', 'farad'],
  ['pF', 'picofarad', 'farad'],
  ['mm²', 'mm^2', 'm^2'],
  ['m²', 'm^2', 'm^2'],
  ['cmil', 'circularmil', 'm^2'],
  ['kcmil', '1000 circularmil', 'm^2'],
  ['mm', 'millimeter', 'm'],
  ['cm', 'centimeter', 'm'],
  ['km', 'kilometer', 'm'],
  ['ft', 'foot', 'm'],
  ['in', 'inch', 'm'],
  ['h', 'hour', 's'],
  ['min', 'minute', 's'],
  ['s', 'second', 's'],
  ['ms', 'millisecond', 's'],
  ['µs', 'microsecond', 's'],
  ['nA', 'nanoampere', 'A'],
  ['MW', 'megawatt', 'watt'],
  ['L', 'liter', 'm^3'],
  ['m', 'meter', 'm'],
  ['K', 'kelvin', 'K'],
  ['%', 'percent', '1'],
  ['Ω·mm²/m', 'ohm mm^2 / m', 'ohm m'],
  ['ohm·cmil/ft', 'ohm circularmil / ft', 'ohm m'],
  ['Ω/km', 'ohm / km', 'ohm / m'],
  ['mΩ/m', 'milliohm / m', 'ohm / m'],
  ['mV/K', 'millivolt / kelvin', 'volt / kelvin'],
  ['1/K', '1 / kelvin', '1 / kelvin'],
  ['W/m^2', 'watt / m^2', 'kg s^-3'],
];

/** Scales with a zero of their own, asked for by a function of the converter. */
const TEMPERATURES = ['°C', '°F'];

function askUnits(have: string, want: string): number {
  return Number(execFileSync('units', ['-t', '-o', '%.15g', have, want], { encoding: 'utf8' }));
}

describe('the unit table against GNU units', () => {
  it('has the same size for every unit', () => {
    for (const [ours, theirs, base] of UNITS) {
      expect(parseUnit(ours).factor / askUnits(theirs, base), ours).toBeCloseTo(1, 11);
    }
  });

  it('has left no unit of the table unasked', () => {
    const asked = new Set(UNITS.map(([ours]) => ours));
    const ours = BASE_UNITS.flatMap(({ symbol, prefixes }) => [
      symbol,
      ...[...prefixes].map((prefix) => prefix + symbol),
    ]);
    expect(ours.filter((symbol) => !TEMPERATURES.includes(symbol) && !asked.has(symbol))).toEqual(
      [],
    );
  });

  it('has the same Celsius and Fahrenheit scales', () => {
    for (const celsius of [-40, 0, 20, 105]) {
      expect(toSi(celsius, parseUnit('°C'))).toBeCloseTo(askUnits(`tempC(${celsius})`, 'K'), 9);
      expect(toSi(celsius, parseUnit('°F'))).toBeCloseTo(askUnits(`tempF(${celsius})`, 'K'), 9);
    }
  });

  it('has the same gauges', () => {
    // GNU units counts 1/0 as 0, 2/0 as −1 and 4/0 as −3.
    const gauges: [string, string][] = [
      ['18 AWG', 'awg(18)'],
      ['10 AWG', 'awg(10)'],
      ['1/0 AWG', 'awg(0)'],
      ['4/0 AWG', 'awg(-3)'],
    ];
    for (const [typed, theirs] of gauges) {
      const read = readQuantity(typed, null);
      if (read.state !== 'quantity') throw new Error(`${typed} was not read`);
      const diameterMm = askUnits(theirs, 'mm');
      expect(read.figure / ((Math.PI / 4) * diameterMm ** 2)).toBeCloseTo(1, 9);
    }
  });

  it('refuses what is no unit', () => {
    expect(() => parseUnit('furlong')).toThrow('"furlong" is not a unit of the table');
    expect(() => parseUnit('Ω·/m')).toThrow();
    expect(() => parseUnit('constructor')).toThrow();
  });
});
