type Outline = readonly (readonly [x: number, y: number])[];

/** Reach of an outline to starboard, mm. */
export function halfSpanOf(outline: Outline): number {
  return Math.max(0, ...outline.map(([, y]) => y));
}

interface OutlinePictureProps {
  /** starboard half in plan view, x aft, y to starboard, mm */
  outline: Outline;
  /** half span that fills the picture, mm, so that several stand to one scale */
  widest: number;
  className?: string;
}

/** Small picture of a wing from above. */
export function OutlinePicture({ outline, widest, className }: OutlinePictureProps) {
  if (outline.length < 3) return <div aria-hidden="true" className={className} />;
  const xs = outline.map(([x]) => x);
  const top = Math.min(...xs);
  const chord = Math.max(1, Math.max(...xs) - top);
  const half = widest * 1.02;
  const points = (side: 1 | -1) => outline.map(([x, y]) => `${side * y},${x - top}`).join(' ');
  return (
    <svg
      viewBox={`${-half} 0 ${2 * half} ${chord}`}
      aria-hidden="true"
      preserveAspectRatio="xMidYMid meet"
      className={className}
      overflow="visible"
    >
      {([1, -1] as const).map((side) => (
        <polygon
          key={side}
          points={points(side)}
          fill="var(--wood-light)"
          stroke="var(--pencil)"
          strokeWidth={1}
          strokeLinejoin="round"
          vectorEffect="non-scaling-stroke"
        />
      ))}
    </svg>
  );
}
