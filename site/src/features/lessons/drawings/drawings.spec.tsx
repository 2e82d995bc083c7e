import { fireEvent, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { expect, it } from 'vitest';
import { ChargeCurve } from './charge-curve.tsx';
import { CurrentBalance } from './current-balance.tsx';
import { SourceTimeline } from './source-timeline.tsx';
import { VoltageRun } from './voltage-run.tsx';

const said = () => screen.getByRole('status').textContent?.replace(/\s+/g, ' ');
const slide = (name: string, value: number) =>
  fireEvent.change(screen.getByRole('slider', { name }), { target: { value } });

it('moves a run: both conductors lose the same, and the limits are judged on both', () => {
  render(
    <VoltageRun
      title="Move the run"
      data={{
        kind: 'voltage-run',
        supplyV: 12.8,
        start: { lengthM: 5, areaMm2: 4, amps: 10 },
        lengthM: { from: 1, to: 15, step: 0.5 },
        amps: { from: 1, to: 30, step: 1 },
        areas: [
          { areaMm2: 4, ohmsPerM: 0.005 },
          { areaMm2: 10, ohmsPerM: 0.002 },
        ],
        limits: [{ percent: 3, volts: 0.36, label: '3 % of 12 V' }],
        source: 'Given.',
      }}
    />,
  );
  // 5 m × 10 A × 5 mΩ/m = 0.25 V each way.
  expect(said()).toMatch(/0\.250 V lost going out.*0\.500 V in all.*3\.9 %.*12\.300 V left/);
  expect(said()).toMatch(/Over 0\.36 V/);
  slide('Length one way', 8);
  fireEvent.change(screen.getByRole('combobox', { name: 'Conductor' }), { target: { value: 10 } });
  // 8 m × 10 A × 2 mΩ/m = 0.16 V each way.
  expect(said()).toMatch(/0\.320 V in all.*Within 0\.36 V/);
  expect(screen.getByRole('slider', { name: 'Length one way' })).toHaveAttribute(
    'aria-valuetext',
    '8 metres',
  );
  expect(within(screen.getByRole('table', { hidden: true })).getByText('12.640')).toBeTruthy();
});

it('goes through a charge stage by stage and round again', async () => {
  const user = userEvent.setup();
  const moment = (volts: number, amps: number, chargePercent: number) => ({
    ...{ volts, amps, chargePercent },
  });
  render(
    <ChargeCurve
      title="Step through"
      data={{
        kind: 'charge-curve',
        settings: { chargerA: 30, absorptionV: 14.4, floatV: 13.6, tailA: 2 },
        battery: { name: 'AGM', capacityAh: 110, startPercent: 50 },
        hours: 3,
        points: [
          { hour: 0, ...moment(12.5, 30, 50) },
          { hour: 1, ...moment(14.4, 30, 85) },
          { hour: 3, ...moment(14.4, 2, 99) },
        ],
        stages: [
          {
            ...{ name: 'bulk', fromH: 0, toH: 1, ah: 30, says: 'All it has.' },
            ...{ from: moment(12.5, 30, 50), to: moment(14.4, 30, 85) },
          },
          {
            ...{ name: 'absorption', fromH: 1, toH: 3, ah: 14, says: 'It falls away.' },
            ...{ from: moment(14.4, 30, 85), to: moment(14.4, 2, 99) },
          },
        ],
        source: 'Computed.',
      }}
    />,
  );
  expect(said()).toMatch(/Stage 1 of 2: bulk.*12\.50 V to 14\.40 V, current held at 30\.0 A/);
  await user.click(screen.getByRole('button', { name: 'Next stage' }));
  expect(said()).toMatch(/Stage 2 of 2: absorption.*held at 14\.40 V.*14\.0 Ah put in.*falls/);
  await user.click(screen.getByRole('button', { name: 'Next stage' }));
  expect(said()).toMatch(/Stage 1 of 2/);
});

it('says which input feeds at each minute, and goes from event to event', async () => {
  const user = userEvent.setup();
  const points = [0, 10, 12].map((minute) => ({ minute, inputV: 12 + minute / 5, chargerA: 6 }));
  render(
    <SourceTimeline
      title="Watch the input"
      data={{
        kind: 'source-timeline',
        settings: { engageV: 13.2, releaseV: 12.8, delayS: 120, solarA: 6, chargerA: 30 },
        minutes: 20,
        events: [
          { minute: 10, title: 'Vehicle on', says: 'It waits.' },
          { minute: 12, title: 'Change-over', says: 'It takes the vehicle.' },
        ],
        spells: [
          {
            ...{ fromMinute: 0, toMinute: 10, engine: false, source: 'solar' },
            ...{ chargerA: 6, says: 'The panel charges.' },
          },
          {
            ...{ fromMinute: 10, toMinute: 12, engine: true, source: 'solar' },
            ...{ chargerA: 6, says: 'Seen, not engaged.' },
          },
          {
            ...{ fromMinute: 12, toMinute: 20, engine: true, source: 'vehicle' },
            ...{ chargerA: 30, says: 'Full output.' },
          },
        ],
        points,
        source: 'Computed.',
      }}
    />,
  );
  expect(said()).toMatch(/Minute 0\. Engine off.*12\.0 V\. Fed by the panel, charger 6 A\./);
  await user.click(screen.getByRole('button', { name: 'Next event' }));
  expect(said()).toMatch(/Minute 10, event 1: Vehicle on\. Engine on.*Fed by the panel.*It waits/);
  slide('Time', 11);
  expect(said()).toMatch(/Minute 11\..*Seen, not engaged/);
  await user.click(screen.getByRole('button', { name: 'Next event' }));
  expect(said()).toMatch(/Change-over.*Fed by the vehicle, charger 30 A/);
  await user.click(screen.getByRole('button', { name: 'Next event' }));
  expect(said()).toMatch(/Minute 0\./);
});

it('balances charger, loads and monitor, and shows what the monitor does not see', async () => {
  const user = userEvent.setup();
  render(
    <CurrentBalance
      title="Three meters"
      data={{
        kind: 'current-balance',
        chargerA: { from: 0, to: 40, step: 0.5, start: 30 },
        loads: [
          { name: 'Lights E1', amps: 3.5, isOn: true },
          { name: 'Motor M1', amps: 7.25, isOn: false },
        ],
        bypass: { name: 'E4 on the post', amps: 2.5, isOn: false },
        source: 'Given.',
      }}
    />,
  );
  expect(said()).toMatch(/Monitor 26\.50 A plus into.*30\.00 − 3\.50 − 26\.50 = 0.*gets 26\.50 A/);
  await user.click(screen.getByRole('checkbox', { name: /E4 on the post/ }));
  expect(said()).toMatch(/Monitor 26\.50 A.*itself gets 24\.00 A.*2\.50 A of E4 on the post/);
  await user.click(screen.getByRole('checkbox', { name: /Motor M1/ }));
  slide('Charger U1', 5);
  expect(said()).toMatch(/Monitor −5\.75 A out of.*5\.00 − 10\.75 \+ 5\.75 = 0.*gives 8\.25 A/);
});
