type Props = { x: number; y: number; length?: number; turn?: number };

/** Air in motion: an arrow that ends at x, y, pointing right unless turned (degrees, clockwise). */
export function Arrow({ x, y, length = 26, turn = 0 }: Props) {
  return (
    <path
      d={`M${-length} 0H0M-7 -4L0 0L-7 4`}
      transform={`translate(${x.toFixed(1)} ${y.toFixed(1)}) rotate(${turn})`}
      className="fill-none stroke-link"
      strokeWidth="1.6"
      strokeLinecap="round"
      strokeLinejoin="round"
    />
  );
}
