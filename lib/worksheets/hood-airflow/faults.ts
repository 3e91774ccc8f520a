import type { FieldFault } from '@/lib/outcome';
import { NUMBERS } from './fields';
import { fieldWords } from './names';

/** Faults as a sentence for whoever typed: the wire says `is missing`, a reader is told of what. */
export function faultsForReader(faults: readonly FieldFault[]): FieldFault[] {
  return faults.map(({ path, message }) => {
    if (path === 'hood') return { path, message: 'Choose the kind of hood.' };
    const field = NUMBERS.find((each) => each === path);
    return { path, message: field && /^[a-z]/.test(message) ? `${fieldWords(field)} ${message}.` : message };
  });
}

/** The same for a list apart from the fields: each sentence begins with the field it is about. */
export function namedFaults(faults: readonly FieldFault[]): FieldFault[] {
  return faults.map(({ path, message }) => {
    const field = NUMBERS.find((each) => each === path);
    return {
      path,
      message: field && !message.startsWith(fieldWords(field)) ? `${fieldWords(field)}: ${message}` : message,
    };
  });
}
