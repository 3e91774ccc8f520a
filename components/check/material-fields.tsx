'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { NameField } from './name-field';

const MOST = 6;

/** One field a material: a laminate or a coated stock has several. */
export function MaterialFields({ materials, error }: { materials: string[]; error?: string }) {
  const [count, setCount] = useState(Math.max(1, materials.length));
  return (
    <div className="space-y-3">
      {Array.from({ length: count }, (_, i) => (
        <NameField
          key={i}
          name="material"
          id={`material-${i + 1}`}
          label={i === 0 ? 'What is it made of?' : `And layer ${i + 1}?`}
          hint={i === 0 ? 'A name, a trade word, an abbreviation or a CAS number' : undefined}
          value={materials[i] ?? ''}
          kind="material"
          error={i === 0 ? error : undefined}
        />
      ))}
      {count < MOST && (
        <Button className="scripts-only" onClick={() => setCount(count + 1)}>
          Add a layer
        </Button>
      )}
    </div>
  );
}
