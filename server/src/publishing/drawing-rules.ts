/** What a drawing may contain. Anything else is refused by name, never silently dropped. */

const PAINTED = ['className', 'transform'];
const LINE_ENDS = ['markerStart', 'markerMid', 'markerEnd'];

export const DRAWING_ATTRIBUTES: Readonly<Record<string, readonly string[]>> = {
  svg: ['xmlns', 'viewBox', 'role', 'ariaLabelledBy'],
  g: PAINTED,
  path: [...PAINTED, ...LINE_ENDS, 'd'],
  line: [...PAINTED, ...LINE_ENDS, 'x1', 'y1', 'x2', 'y2'],
  polyline: [...PAINTED, ...LINE_ENDS, 'points'],
  polygon: [...PAINTED, 'points'],
  rect: [...PAINTED, 'x', 'y', 'width', 'height', 'rx', 'ry'],
  circle: [...PAINTED, 'cx', 'cy', 'r'],
  ellipse: [...PAINTED, 'cx', 'cy', 'rx', 'ry'],
  text: [...PAINTED, 'x', 'y', 'dx', 'dy', 'textAnchor', 'dominantBaseline'],
  tspan: ['className', 'x', 'y', 'dx', 'dy'],
  title: ['id'],
  desc: ['id'],
  defs: [],
  marker: [
    'id',
    'className',
    'viewBox',
    'refX',
    'refY',
    'markerWidth',
    'markerHeight',
    'markerUnits',
    'orient',
  ],
};

/** Colours and weights come from the page, through these names. */
export const DRAWING_CLASSES: ReadonlySet<string> = new Set([
  'ln',
  'lnb',
  'live',
  'dead',
  'busbar',
  'fillink',
  'fillcopper',
  'fillsheet',
  'fillinset',
  'fillverd',
  'tx',
  'tx-s',
  'tx-b',
  'tx-i',
  'dim',
  'curve-v',
  'curve-i',
  'dash',
]);
