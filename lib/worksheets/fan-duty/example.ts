import type { FanDutyQuestion } from './schema';

/** A question to look at before one's own. Fan and duct are invented. */
export const FAN_DUTY_EXAMPLE: FanDutyQuestion = {
  fan: {
    curve: [
      { airflow: 0, staticPressure: 420 },
      { airflow: 0.05, staticPressure: 390 },
      { airflow: 0.1, staticPressure: 330 },
      { airflow: 0.15, staticPressure: 230 },
      { airflow: 0.2, staticPressure: 90 },
      { airflow: 0.225, staticPressure: 0 },
    ],
  },
  hood: { entryLossFactor: 0.49 },
  runs: [
    { duct: 'flexible-slack', diameter: 0.125, length: 1.5 },
    { duct: 'galvanised-steel', diameter: 0.125, length: 5, fittings: [{ fitting: 'elbow-90-r1.5', count: 2 }] },
  ],
  filter: { clean: 60, loaded: 180, at: 0.15 },
  targetAirflow: 0.12,
};
