import { useId, type ReactNode } from 'react';

type Props = { title?: string; level?: 2 | 3; look?: 'panel' | 'plate'; className?: string; children: ReactNode };

/** A ruled panel; as a plate it is the one riveted beside an entry's text. */
export function Panel({ title, level = 2, look = 'panel', className = '', children }: Props) {
  const id = useId();
  const Heading = level === 2 ? 'h2' : 'h3';
  if (!title) return <div className={`${look} ${className}`}>{children}</div>;
  return (
    <section aria-labelledby={id} className={`${look} ${className}`}>
      <Heading id={id} className="mb-2">
        {title}
      </Heading>
      {children}
    </section>
  );
}
