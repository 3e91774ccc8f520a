'use client';

import type { ReactNode } from 'react';
import { useFormStatus } from 'react-dom';
import { Button } from '@/components/ui/button';

type Props = { children: ReactNode; busy?: string; name?: string; value?: string; variant?: 'primary' | 'plain' };

/** Sends its form; while an action runs it says so and takes no second click. */
export function SubmitButton({ children, busy = 'One moment…', variant = 'primary', ...rest }: Props) {
  const { pending } = useFormStatus();
  return (
    <Button
      type="submit"
      variant={variant}
      aria-disabled={pending || undefined}
      onClick={(event) => pending && event.preventDefault()}
      {...rest}
    >
      {pending ? busy : children}
    </Button>
  );
}
