import { Unit } from 'mathjs';
import { FUNCTIONS } from './functions.ts';
import { unitsSpelt } from './units.ts';

const RESERVED = new Set(['constructor', 'prototype', 'hasOwnProperty', 'toString', 'valueOf']);
const CONSTANTS = new Set(
  'e pi tau phi i true false null undefined infinity nan version end mod to in and or not xor'.split(
    ' ',
  ),
);

/** Why a name may not be declared, or null when it may. */
export function refusalOf(name: string): string | null {
  const taken =
    FUNCTIONS.has(name) || RESERVED.has(name)
      ? 'a function'
      : isUnitOrConstant(name)
        ? 'a unit, prefix or constant'
        : null;
  return taken && `Name "${name}" is ${taken} already; give the quantity a longer name.`;
}

function isUnitOrConstant(name: string): boolean {
  // Both are there at run time and missing from the declared types.
  const mathUnit = Unit as unknown as {
    isValuelessUnit(name: string): boolean;
    PREFIXES: Record<string, Record<string, unknown>>;
  };
  return (
    CONSTANTS.has(name.toLowerCase()) ||
    unitsSpelt(name).length > 0 ||
    mathUnit.isValuelessUnit(name) ||
    Object.values(mathUnit.PREFIXES).some((family) => Object.hasOwn(family, name))
  );
}
