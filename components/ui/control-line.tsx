import type { ControlAnswer } from '@/lib/entries/vocabulary';
import { CONTROL_WORDS } from './control-words';
import { Glyph, type GlyphSize } from './glyph';

export type Basis = 'reviewed' | 'inferred' | 'none';

type Props = { control: ControlAnswer; reason?: string; size?: GlyphSize; basis?: Basis };

const WORDS: Record<GlyphSize, string> = {
  small: 'font-semibold',
  medium: 'text-lg font-bold',
  large: 'text-2xl leading-tight font-bold',
};

const UNKNOWN_REASON = 'What it is made of is not known here: treat it as prohibited until it is.';

/** A control as it is shown everywhere: the glyph, the word, and one line of reason. */
export function ControlLine({ control, reason, size = 'small', basis }: Props) {
  const line = reason ?? (control === 'unknown' ? UNKNOWN_REASON : undefined);
  return (
    <p data-control={control} className="flex items-start gap-2.5">
      <Glyph control={control} size={size} />
      <span className={size === 'large' ? 'self-center' : undefined}>
        <strong className={WORDS[size]}>{CONTROL_WORDS[control]}</strong>
        {basis === 'inferred' && <em className="label not-italic"> · inferred from composition, not reviewed</em>}
        {line && <span className="block text-base leading-snug">{line}</span>}
      </span>
    </p>
  );
}
