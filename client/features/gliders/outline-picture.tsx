/** Small picture of a wing from above, made from the outline of its starboard half (x aft, y to starboard, mm). */
export function OutlinePicture({
  outline,
  className,
}: {
  outline: readonly (readonly [number, number])[];
  className?: string;
}) {
  if (outline.length < 3) {
    return <div aria-hidden="true" className={className} />;
  }
  const xs = outline.map(([x]) => x);
  const halfSpan = Math.max(1, ...outline.map(([, y]) => y));
  const top = Math.min(...xs);
  const chord = Math.max(1, Math.max(...xs) - top);
  const points = (side: 1 | -1) => outline.map(([x, y]) => `${side * y},${x - top}`).join(' ');
  return (
    <svg
      viewBox={`${-halfSpan} 0 ${2 * halfSpan} ${chord}`}
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
