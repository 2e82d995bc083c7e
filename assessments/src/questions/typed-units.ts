import { parseUnit } from './unit-expression.ts';
import { type Unit, unitsSpelt } from './units.ts';

/**
 * By unit, ways of writing it that people use and a question sheet does not, in small letters
 * and without spaces, hyphens and full stops.
 */
const LOOSE: Readonly<Record<string, string>> = {
  '°C': '° º ˚ c °c ºc ˚c deg degs degree degrees degreec degsc centigrade degreescentigrade',
  '°F': 'f °f ºf ˚f degreef',
  Ω: 'r ω',
  mΩ: 'mr mω',
  kΩ: 'k kr kω kilohm kilohms',
  MΩ: 'megohm megohms',
  m: 'mtr mtrs',
  'mm²':
    'squaremm mmsquared mm**2 ㎟ squaremillimeter squaremillimeters millimetressquared millimeterssquared',
  'm²': 'squaremetre squaremetres squaremeter squaremeters',
  cmil: 'cma circmil circmils circularmils',
  kcmil: 'kcm',
  Ah: 'ahr ahrs amphr amphrs amperehour amperehours',
  Wh: 'whr whrs watthr watthrs',
  kWh: 'kwhr kwhrs kilowatthr kilowatthrs',
  '%': 'percentage',
};
const UNIT_OF = new Map(
  Object.entries(LOOSE).flatMap(([unit, ways]) => ways.split(' ').map((way) => [way, unit])),
);

/** "V DC", "amps d.c.": what kind of current it is says nothing about the size. */
const DIRECT_CURRENT = /^(.*[VAW]|.*\b(?:volts?|amps?|watts?)) ?d\.?c\.?$/i;

/** Units that what was typed behind a figure may stand for, likeliest first; empty when none. */
export function unitsTyped(spelling: string): readonly Unit[] {
  const tidy = spelling.replace(/\.$/, '').replace(DIRECT_CURRENT, '$1').trim();
  const found = unitsAlone(tidy);
  return found.length > 0 ? found : compoundUnits(tidy);
}

function unitsAlone(spelling: string): readonly Unit[] {
  const close = spelling.replace(/[ .-]/g, '');
  const loose = UNIT_OF.get(close.toLowerCase()) ?? '';
  return [spelling, close, loose].flatMap((way) => unitsSpelt(way));
}

/** A unit that is made of some that are in the table: "mΩ/m", "ohms per km", "Ω mm²/m". */
function compoundUnits(spelling: string): readonly Unit[] {
  const quotient = spelling.replace(/ ?\bper\b ?/gi, '/').replace(/ ?([/·*]) ?/g, '$1');
  for (const written of [quotient, quotient.replaceAll(' ', '·')]) {
    const factors = written.split(/([/·*])/);
    if (factors.length === 1 && !/[²³]|\^\d/.test(written)) continue;
    try {
      return [parseUnit(factors.map((factor) => unitsAlone(factor)[0]?.symbol ?? factor).join(''))];
    } catch {
      // Some part of it is no unit.
    }
  }
  return [];
}
