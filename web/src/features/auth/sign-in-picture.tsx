import { formatNumber } from '../../lib/money';

// Invented items, laid end to end along the rod: [name, thousands].
const ITEMS = [
  ['Chemistry analyser', 236],
  ['Video endoscope set', 184],
  ['Mobile X-ray unit', 168],
  ['Laparoscopy tower', 158],
  ['Steam steriliser', 154],
  ['Anaesthesia workstation', 142],
  ['Echo scanner', 128],
  ['OCT scanner', 89],
] as const;
const COLOURS = ['#34265e', '#7d6bc4', '#00737f'];
const INK = '#2b1f00';
const WOOD = 'var(--mw-rod)';

const LEFT = 64;
const PER_THOUSAND = 0.42;
const ROD_TOP = 700;
// Long enough to run out of a wide window; the rest is cut off.
const ROD_LENGTH = 2520;
const GRADUATION = 4.2;
const CEILING = LEFT + 1600 * PER_THOUSAND;

/** Equipment laid along a rod up to the ceiling. Decoration beside the form. */
export function SignInPicture() {
  return (
    <svg viewBox="0 0 820 900" preserveAspectRatio="xMinYMid meet" fontFamily="var(--mw-font)" aria-hidden>
      {ITEMS.map(([name, thousands], index) => (
        <Item key={name} name={name} thousands={thousands} index={index} x={startOf(index)} />
      ))}
      <path d={`M${startOf(ITEMS.length)} 626V${ROD_TOP}`} stroke={INK} opacity=".28" strokeDasharray="1 5" />
      <g>
        <rect x={LEFT} y={ROD_TOP} width={ROD_LENGTH} height="64" fill={INK} />
        {Array.from({ length: ROD_LENGTH / GRADUATION + 1 }, (_, i) => (
          <path
            key={i}
            d={`M${LEFT + i * GRADUATION} ${ROD_TOP}v${height(i)}`}
            stroke={WOOD}
            strokeWidth={i % 10 === 0 ? 2 : 1}
          />
        ))}
        {Array.from({ length: ROD_LENGTH / (10 * GRADUATION) }, (_, i) => i + 1)
          .filter((i) => i !== 16)
          .map((i) => (
            <text
              key={i}
              x={LEFT + i * 10 * GRADUATION}
              y={ROD_TOP + 52}
              fontSize="14"
              fontWeight="600"
              fill={WOOD}
              textAnchor="middle"
            >
              {i}
            </text>
          ))}
      </g>
      <path d={`M${CEILING - 2.5} 132V790M${CEILING + 2.5} 132V790`} stroke={INK} strokeWidth="1.6" />
      <text x={CEILING} y="120" fontSize="14" fontWeight="600" fill={INK} textAnchor="middle">
        Budget ceiling
      </text>
      <text x={LEFT} y="790" fontSize="13" fill={INK}>
        Each long graduation is {formatNumber(100_000)} €
      </text>
    </svg>
  );
}

function Item({ name, thousands, index, x }: { name: string; thousands: number; index: number; x: number }) {
  const y = 176 + index * 58;
  const width = thousands * PER_THOUSAND;
  return (
    <g>
      <path d={`M${x} ${y + 44}V${ROD_TOP}`} stroke={INK} opacity=".28" strokeDasharray="1 5" />
      <rect x={x} y={y} width={width} height="44" fill={COLOURS[index % COLOURS.length]} />
      <text x={x + width + 10} y={y + 19} fontSize="14" fontWeight="600" fill={INK}>
        {name}
      </text>
      <text x={x + width + 10} y={y + 37} fontSize="13" fill={INK}>
        {formatNumber(thousands * 1000)} €
      </text>
    </g>
  );
}

function startOf(index: number): number {
  return ITEMS.slice(0, index).reduce((x, [, thousands]) => x + thousands * PER_THOUSAND, LEFT);
}

function height(index: number): number {
  if (index % 10 === 0) return 34;
  return index % 5 === 0 ? 22 : 12;
}
