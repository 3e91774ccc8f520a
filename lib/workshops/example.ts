import { paramsOf } from '@/lib/worksheets/ask/typed';
import { typedOf } from '@/lib/worksheets/ask/request';
import { workshopAsk } from './ask';
import type { Plan } from './plan-schema';

/** The plastics and electronics rooms of the invented Quillon Yard Workshop: nothing in it was measured anywhere. */
export const EXAMPLE_PLAN: Plan = {
  name: 'Quillon Yard Workshop (invented)',
  climate: { indoor: 20, outdoor: 2 },
  rooms: [
    {
      ...{ name: 'Plastics room', volume: 62, height: 2.6, ach50: 6, openings: [{ area: 0.02, height: 2.1 }] },
      appliances: [{ name: 'water heater', vent: 'natural-draught', flueHeight: 5, flueTemperature: 90 }],
    },
    { name: 'Electronics room', volume: 44, height: 2.6, openings: [{ area: 0.15, height: 1 }] },
  ],
  exhausts: [
    {
      ...{ name: 'laser exhaust', room: 'Plastics room', entryLossFactor: 0.5 },
      fan: {
        curve: [
          { airflow: 0, staticPressure: 620 },
          { airflow: 0.1, staticPressure: 540 },
          { airflow: 0.2, staticPressure: 330 },
          { airflow: 0.28, staticPressure: 0 },
        ],
      },
      runs: [
        { duct: 'flexible-slack', diameter: 0.1, length: 3 },
        { duct: 'galvanised-steel', diameter: 0.125, length: 4, fittings: [{ fitting: 'elbow-90-r1', count: 3 }] },
      ],
      filter: { clean: 60, loaded: 180, at: 0.14 },
    },
    { name: 'bench fan', room: 'Electronics room', airflow: 0.06 },
  ],
  stations: [
    { name: 'laser cutter', exhaust: 'laser exhaust', process: 'laser-cutting', hood: 'enclosure', openArea: 0.12 },
    {
      name: 'soldering bench',
      exhaust: 'bench fan',
      process: 'soldering',
      hood: 'plain-opening',
      distance: 0.2,
      diameter: 0.1,
    },
  ],
  materials: [{ material: 'acrylic' }, { material: 'plywood' }, { material: 'pvc' }, { material: 'lead-free-solder' }],
  readings: [
    { exhaust: 'laser exhaust', kind: 'static-pressure', date: '2026-03-02', who: 'keeper', pressure: 240 },
    { exhaust: 'laser exhaust', kind: 'static-pressure', date: '2026-09-07', who: 'keeper', pressure: 305 },
  ],
};

const NONE = { rooms: [], exhausts: [], processes: [], materials: [] };

/** The same as it would be kept. */
export const exampleDocument = () => paramsOf(typedOf(workshopAsk(NONE), EXAMPLE_PLAN)).toString();
