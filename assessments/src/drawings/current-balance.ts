import { type CurrentBalanceDrawing } from './types.ts';

/** The negative bar of the course: what is put in, what is taken, and what a shunt cannot see. */
export function drawCurrentBalance(): CurrentBalanceDrawing {
  return {
    kind: 'current-balance',
    chargerA: { from: 0, to: 40, step: 0.5, start: 30 },
    loads: [
      { name: 'Lights E1', amps: 3.5, isOn: true },
      { name: 'Motor M1', amps: 7.2, isOn: true },
      { name: 'Heater E2', amps: 3.25, isOn: true },
    ],
    bypass: { name: 'E4 on the battery post', amps: 2.4, isOn: false },
    source:
      'Kirchhoff’s first law at the negative bar: definition. The currents are given data of the course.',
  };
}
