import { worksheet } from '@/lib/worksheets/worksheet';
import { hoodAirflowAddress, hoodAirflowAnswer, hoodAirflowRequest } from './schema';
import { solveHoodAirflow } from './solve';
import { hoodTable } from './table';

/** The hood worksheet. */
export const hoodAirflow = worksheet({
  about: {
    name: 'hood-airflow',
    title: 'How much air does a hood need?',
    question: 'My hood stands this far from the work. How much air must it draw to catch what comes off?',
    summary:
      'From the kind of hood, its size and its distance from the work to the airflow it must draw, with how fast the pull falls off on the way.',
    names: [
      'hood airflow',
      'capture velocity',
      'hood sizing',
      'extraction rate',
      'DallaValle',
      'cfm for a hood',
      'm³/h for a hood',
    ],
    everyday: [
      'how big a fan',
      'how strong must the extractor be',
      'fume arm too far away',
      'smoke drifts past the hood',
      'snorkel',
      'suction at the source',
    ],
  },
  request: hoodAirflowRequest,
  answer: hoodAirflowAnswer,
  address: hoodAirflowAddress,
  solve: solveHoodAirflow,
  table: hoodTable,
});
