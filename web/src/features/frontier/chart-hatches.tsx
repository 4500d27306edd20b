/** The two patterns of the chart: the gap still open, at 45°, and what lies above the ceiling, against it. */
export function Hatches({ gap, ceiling }: { gap: string; ceiling: string }) {
  return (
    <defs>
      <GapHatch id={gap} />
      <pattern id={ceiling} width="9" height="9" patternUnits="userSpaceOnUse" patternTransform="rotate(-45)">
        <path d="M0 0V9" stroke="var(--mw-ink-3)" strokeWidth="1" opacity="0.3" />
      </pattern>
    </defs>
  );
}

export function GapHatch({ id }: { id: string }) {
  return (
    <pattern id={id} width="6" height="6" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
      <rect width="6" height="6" fill="var(--mw-chart-gap)" opacity="0.28" />
      <path d="M0 0V6" stroke="var(--mw-chart-bound)" strokeWidth="1.6" opacity="0.75" />
    </pattern>
  );
}
