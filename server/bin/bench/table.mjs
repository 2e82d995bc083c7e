import { cpus, loadavg } from 'node:os';

const headings = ['', 'ours', 'bare', 'ratio', 'middle half', 'at most'];

function inUnits(milliseconds) {
  return milliseconds < 1
    ? `${(milliseconds * 1000).toPrecision(3)} µs`
    : `${milliseconds.toPrecision(3)} ms`;
}

const times = (ratio) => ratio.toFixed(ratio < 100 ? 2 : 0);

const cellsOf = ({ what, ours, bare, ratio, low, high, bound }) => [
  what,
  inUnits(ours),
  inUnits(bare),
  times(ratio),
  `${times(low)} to ${times(high)}`,
  bound === undefined ? '' : times(bound),
];

const aloneCells = ({ what, perSecond, milliseconds, bound }) => [
  what,
  perSecond === undefined ? inUnits(milliseconds) : `${perSecond.toLocaleString('en')} a second`,
  bound === undefined ? '' : `at most ${inUnits(bound)}`,
];

const pageHeadings = ['First visit on a phone', 'largest paint', 'blocked', 'shifted', 'axe'];

const pageCells = ({ what, largestMs, blockedMs, shifted, violations }) => [
  what,
  `${(largestMs / 1000).toFixed(1)} s`,
  `${Math.round(blockedMs)} ms`,
  shifted.toFixed(3),
  violations.length === 0 ? 'nothing found' : violations.join(' '),
];

function columns(lines) {
  const widths = lines[0].map((_, column) => Math.max(...lines.map((line) => line[column].length)));
  return lines.map((line) =>
    line
      .map((cell, column) =>
        column === 0 ? cell.padEnd(widths[0]) : cell.padStart(widths[column]),
      )
      .join('  ')
      .trimEnd(),
  );
}

const isOver = ({ ratio, milliseconds, bound }) =>
  bound !== undefined && (ratio ?? milliseconds) > bound;

/** What is over its bound, by name. */
export const overBounds = ({ rows, alone }) =>
  [...rows, ...alone].filter(isOver).map(({ what }) => what.trim());

/** The tables and what may be read out of them. */
export function drawTable({ rows, alone, pages }) {
  return [
    ...columns([headings, ...rows.map(cellsOf)]),
    '',
    ...columns(alone.map(aloneCells)),
    '',
    ...columns([pageHeadings, ...pages.map(pageCells)]),
    '',
    `Figures are ratios of one run on this machine (processors: ${cpus().length}, load: ${loadavg()[0].toFixed(1)}):`,
    'medians of alternating rounds and the middle half of their ratios; times mean nothing elsewhere.',
    'Draw and mark: ours draws a question and judges its answers (marks, verdicts, rules); bare is mathjs',
    'with units, expressions compiled beforehand, working once each what a draw needs (conditions, steps,',
    'slips of what is asked) and, after a slip, the steps and slips that lean on it once more. Questions',
    'with a curve or a look-up are left out of it. Rejected draws and reading the answers are ours alone.',
    'Phone: middle of three visits, nothing cached, processor four times slower, 150 ms, 1.6 Mbit/s.',
    'Growth: bare is the question of two parts, times are for each part. A second is one of processor time.',
  ].join('\n');
}
