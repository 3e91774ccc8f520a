import type { FieldFault } from '@/lib/outcome';
import { fieldId } from './field-id';

type Props = { errors?: FieldFault[]; title?: string; detail?: string };

/** All that was wrong with a form, above it; each line leads to its field. */
export function ErrorList({ errors = [], title = 'Some of this needs another look', detail }: Props) {
  if (errors.length === 0 && !detail) return null;
  return (
    <div role="alert" className="space-y-1 border-l-4 border-kiln bg-surface px-4 py-3">
      <p className="font-semibold">{title}</p>
      {detail && <p>{detail}</p>}
      {errors.length > 0 && (
        <ul className="list-disc pl-5">
          {errors.map(({ path, message }) => (
            <li key={`${path} ${message}`}>{path ? <a href={`#${fieldId(path)}`}>{message}</a> : message}</li>
          ))}
        </ul>
      )}
    </div>
  );
}
