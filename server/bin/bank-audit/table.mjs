const columns = [
  { heading: 'question', width: 28, cell: ({ slug }) => slug },
  { heading: 'rejected', width: 8, cell: ({ rejectedShare }) => percent(rejectedShare) },
  { heading: 'nearest slip', width: 12, cell: ({ parts }) => nearest(parts) },
  { heading: 'least live', width: 10, cell: ({ slips }) => leastLive(slips) },
  { heading: 'as a given', width: 10, cell: ({ parts }) => mostGiven(parts) },
  { heading: 'papers', width: 6, cell: ({ papers }) => String(papers) },
  { heading: 'ms a draw', width: 9, cell: ({ msPerDraw }) => msPerDraw.toFixed(3) },
];

const percent = (share) => `${(share * 100).toFixed(0)} %`;

function nearest(parts) {
  const found = parts.flatMap(({ nearestSlip }) => (nearestSlip === null ? [] : [nearestSlip]));
  return found.length === 0 ? '-' : `${Math.min(...found).toFixed(1)} tol.`;
}

function leastLive(slips) {
  return slips.length === 0 ? '-' : percent(Math.min(...slips.map(({ liveShare }) => liveShare)));
}

function mostGiven(parts) {
  return percent(Math.max(0, ...parts.map(({ givenShare }) => givenShare)));
}

const lineOf = (cells) =>
  cells
    .map((cell, at) =>
      at === 0 ? cell.padEnd(columns[at].width) : cell.padStart(columns[at].width),
    )
    .join('  ');

export const headings = () => lineOf(columns.map(({ heading }) => heading));

const figure = (value) => String(Number(value.toPrecision(3)));

/** A question's figures, and below them the range of each answer that is a figure. */
export function rowOf(audit) {
  const ranges = audit.parts.flatMap(({ id, range, unit }) =>
    range ? [`(${id}) ${figure(range.least)} to ${figure(range.most)} ${unit}`.trim()] : [],
  );
  const row = lineOf(columns.map(({ cell }) => cell(audit)));
  return ranges.length === 0 ? row : `${row}\n    ${ranges.join(', ')}`;
}

export const breachLine = ({ slug, figure: what, value, bound, remedy }) =>
  `${slug}: ${what}: ${value}, must be ${bound}; ${remedy}.`;
