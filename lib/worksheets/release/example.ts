import type { ReleaseQuestion } from './schema';

/** A question to look at before one's own: a cut nobody should make. Invented. */
export const RELEASE_EXAMPLE: ReleaseQuestion = {
  material: 'pvc',
  cut: { length: 1.5, kerf: 0.0002, thickness: 0.003 },
  room: { volume: 62, airflow: 0.1 },
};
