import { cpus, loadavg } from 'node:os';

const headings = ['', 'ours', 'bare', 'ratio', 'middle half'];

function inUnits(milliseconds) {
  return milliseconds < 1
    ? `${(milliseconds * 1000).toPrecision(3)} µs`
    : `${milliseconds.toPrecision(3)} ms`;
}

const times = (ratio) => ratio.toFixed(ratio < 100 ? 2 : 0);

const cellsOf = ({ what, ours, bare, ratio, low, high }) => [
  what,
  inUnits(ours),
  inUnits(bare),
  times(ratio),
  `${times(low)} to ${times(high)}`,
];

/** The table and what may be read out of it. */
export function drawTable(rows) {
  const lines = [headings, ...rows.map(cellsOf)];
  const widths = headings.map((_, column) => Math.max(...lines.map((line) => line[column].length)));
  const drawn = lines.map((line) =>
    line
      .map((cell, column) =>
        column === 0 ? cell.padEnd(widths[0]) : cell.padStart(widths[column]),
      )
      .join('  '),
  );
  return [
    ...drawn,
    '',
    `Figures are ratios of one run on this machine (processors: ${cpus().length}, load: ${loadavg()[0].toFixed(1)}):`,
    'medians of alternating rounds and the middle half of their ratios; times mean nothing elsewhere.',
  ].join('\n');
}
