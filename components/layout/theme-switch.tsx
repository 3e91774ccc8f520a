import type { ReactNode } from 'react';
import { Choice } from './choice';

function Lamp({ children }: { children: ReactNode }) {
  return (
    <svg viewBox="0 0 16 16" className="size-4 fill-none stroke-current" strokeWidth="1.6" aria-hidden="true">
      {children}
    </svg>
  );
}

const THEMES = [
  {
    value: 'system',
    label: 'Colours as the system',
    shown: (
      <Lamp>
        <circle cx="8" cy="8" r="6" />
        <path d="M8 2a6 6 0 0 1 0 12Z" fill="currentColor" />
      </Lamp>
    ),
  },
  {
    value: 'light',
    label: 'Light colours',
    shown: (
      <Lamp>
        <circle cx="8" cy="8" r="6" />
      </Lamp>
    ),
  },
  {
    value: 'dark',
    label: 'Dark colours',
    shown: (
      <Lamp>
        <circle cx="8" cy="8" r="6" fill="currentColor" />
      </Lamp>
    ),
  },
];

export function ThemeSwitch() {
  return <Choice name="theme" legend="Colours" options={THEMES} />;
}
