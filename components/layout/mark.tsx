import { hatch } from '@/components/ui/glyph-paths';

const LINES = hatch(4.4);

/** The product's mark: a duct section, half filled. */
export function Mark() {
  return (
    <svg viewBox="0 0 32 32" aria-hidden="true" className="size-7 fill-none stroke-current">
      <path d={LINES} strokeWidth="1.5" />
      <rect x="4" y="4" width="24" height="24" rx="7" strokeWidth="2.4" />
    </svg>
  );
}
