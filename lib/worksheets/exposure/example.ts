import type { ExposureQuestion } from './schema';

/** A question to look at before one's own. The readings are invented. */
export const EXPOSURE_EXAMPLE: ExposureQuestion = {
  items: [
    { substance: 'toluene', value: 30, unit: 'ppm' },
    { substance: 'acetone', value: 80, unit: 'ppm' },
  ],
  basis: 'TWA',
};
