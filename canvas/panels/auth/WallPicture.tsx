import { useTheme } from '../../ui/theme';

const GROUND = 600;
const COURSE = 46;
const UNIT = 118;
const JOINT = 6;
const LEFT = 150;
/** How far each course of the lead has been laid, from the first up. */
const LAID = [640, 640, 640, 640, 522, 404, 286];

interface Unit {
  readonly x: number;
  readonly y: number;
  readonly width: number;
}

function units(): readonly Unit[] {
  return LAID.flatMap((end, course) => {
    const row: Unit[] = [];
    const y = GROUND - (course + 1) * COURSE + JOINT;
    let x = LEFT;
    let width = course % 2 === 0 ? UNIT : UNIT / 2;
    while (x < end) {
      row.push({ x, y, width: Math.min(width, 640 - x) });
      x += width + JOINT;
      width = UNIT;
    }
    return row;
  });
}

/** A corner going up to its story pole: beside the forms on a wide screen. */
export function WallPicture({ label }: { label: string }) {
  const { colours } = useTheme();
  const next = GROUND - 8 * COURSE + JOINT;
  const courses = Array.from({ length: 11 }, (_, i) => GROUND - (i + 1) * COURSE + JOINT);
  return (
    <svg
      role="img"
      aria-label={label}
      viewBox="0 0 640 700"
      preserveAspectRatio="xMidYMax slice"
      width="100%"
      height="100%"
    >
      <rect x={-400} y={GROUND} width={1600} height={400} fill={colours.concrete} />
      <path d={`M-400 ${GROUND}H1200`} stroke={colours.ink} strokeWidth={3} />
      <g fill={colours.earth} stroke={colours.ink} strokeWidth={2}>
        {units().map(({ x, y, width }) => (
          <rect key={`${x} ${y}`} x={x} y={y} width={width} height={COURSE - JOINT} />
        ))}
      </g>
      <path d={`M122 190L16 ${GROUND}`} stroke={colours.steel} strokeWidth={5} />
      <circle cx={16} cy={GROUND} r={8} fill={colours.surface} stroke={colours.steel} strokeWidth={4} />
      <rect x={112} y={70} width={22} height={GROUND - 70} fill={colours.steel} />
      <rect x={127} y={70} width={7} height={GROUND - 70} fill={colours.steelLight} />
      {courses.map((y) => (
        <path key={y} d={`M104 ${y}h38`} stroke={colours.line} strokeWidth={2.5} />
      ))}
      <path d="M-400 342H1200" stroke={colours.levelLine} strokeWidth={2.5} strokeDasharray="26 8 4 8" />
      <path d={`M96 ${next}H640`} stroke={colours.line} strokeWidth={5} />
    </svg>
  );
}
