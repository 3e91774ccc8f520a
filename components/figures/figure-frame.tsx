import { useId, type ReactNode } from 'react';

export const FRAME = { width: 440, height: 310 };

type Props = { title: string; text: string; note?: string; children: ReactNode; below?: ReactNode };

/** A drawing with its result in words: the words are what a screen reader says and what stays when the drawing is lost. */
export function FigureFrame({ title, text, note, children, below }: Props) {
  const id = useId();
  return (
    <figure className="space-y-2">
      <svg
        viewBox={`0 0 ${FRAME.width} ${FRAME.height}`}
        role="img"
        aria-labelledby={`${id}-title ${id}-text`}
        className="h-auto w-full max-w-2xl border border-rule bg-surface"
      >
        <title id={`${id}-title`}>{title}</title>
        <desc id={`${id}-text`}>{text}</desc>
        {children}
      </svg>
      {note && <figcaption className="text-base text-quiet">{note}</figcaption>}
      {below}
    </figure>
  );
}
