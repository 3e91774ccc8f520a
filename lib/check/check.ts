import type { Limit } from '@/lib/entries/schema';
import type { ControlAnswer, Hood, Kind } from '@/lib/entries/vocabulary';

export type CheckBasis = 'reviewed' | 'inferred' | 'none';
export type Reason = { text: string; sources: string[] };
export type ReleasedSubstance = {
  substance: string;
  name: string;
  cas: string | null;
  carcinogen?: string;
  form?: string;
  known?: string;
  limits: Pick<
    Limit,
    'authority' | 'basis' | 'value' | 'unit' | 'source' | 'provenance' | 'averaging' | 'as' | 'note'
  >[];
};
export type CheckCapture = {
  velocity: { min: number; max: number };
  hood: Hood;
  distance: number | null;
  airflow: { min: number; max: number };
  equation: string;
};
export type CitedSource = {
  id: string;
  title: string;
  publisher: string;
  year: string;
  locator?: string;
  url?: string;
};

/** The answer to "may this material meet this process, and under what control". Shape fixed by the API. */
export type CheckAnswer = {
  materials: string[];
  process: string;
  control: ControlAnswer;
  basis: CheckBasis;
  reasons: Reason[];
  releases: ReleasedSubstance[];
  capture: CheckCapture | null;
  cautions: string[];
  sources: CitedSource[];
  entries: { kind: Kind; slug: string; revision: number; url: string }[];
};

/** The check's own address for a question, to be sent to somebody. */
export const checkUrl = (materials: string[], process: string) =>
  `/check?${new URLSearchParams([...materials.map((material) => ['material', material]), ['process', process]])}`;
