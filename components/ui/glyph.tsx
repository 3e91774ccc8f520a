import type { ControlAnswer } from '@/lib/entries/vocabulary';
import { crossHatch, cutOut, dots, hatch } from './glyph-paths';

export type GlyphSize = 'small' | 'medium' | 'large';

const SIZES: Record<GlyphSize, string> = { small: 'size-5 mt-[0.15em]', medium: 'size-8', large: 'size-16' };
const HATCH = hatch(4.4);
const CROSS_HATCH = crossHatch(3.6);

function Fill({ control }: { control: ControlAnswer }) {
  if (control === 'general ventilation') return <path d={dots} strokeWidth="2.6" strokeLinecap="round" />;
  if (control === 'local exhaust') return <path d={HATCH} strokeWidth="1.5" />;
  if (control === 'enclosed exhaust') return <path d={CROSS_HATCH} strokeWidth="1.5" />;
  if (control === 'prohibited') return <path d={cutOut} fill="currentColor" fillRule="evenodd" stroke="none" />;
  return null;
}

/** A rounded duct section seen end-on: the denser its fill, the tighter the air must be held. The word beside it says the same. */
export function Glyph({ control, size = 'small' }: { control: ControlAnswer; size?: GlyphSize }) {
  const edge = control === 'prohibited' ? 'stroke-kiln' : undefined;
  return (
    <svg
      viewBox="0 0 32 32"
      aria-hidden="true"
      focusable="false"
      data-control={control}
      className={`${SIZES[size]} inline-block shrink-0 fill-none stroke-current text-ink`}
    >
      <Fill control={control} />
      <rect
        x={control === 'prohibited' ? 2.4 : 4}
        y={control === 'prohibited' ? 2.4 : 4}
        width={control === 'prohibited' ? 27.2 : 24}
        height={control === 'prohibited' ? 27.2 : 24}
        rx={control === 'prohibited' ? 8.6 : 7}
        strokeWidth="2"
        strokeDasharray={control === 'unknown' ? '5 4.2' : undefined}
        className={edge}
      />
    </svg>
  );
}
