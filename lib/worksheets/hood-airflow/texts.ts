import type { Warning } from '@/lib/worksheets/worksheet';
import type { Work } from './fields';

/** What must be said before any number, by what is true of the work. */
export const BEFORE: Partial<Record<Work, Warning>> = {
  unidentified: {
    code: 'unidentified',
    text: 'A material that is not identified is not to be run, whatever the airflow. Find out what it is first.',
  },
  'sprayed-isocyanates': {
    code: 'sprayed-isocyanates',
    text: 'A hood at the bench does not control sprayed isocyanates. They are sprayed in a booth, by trained people with supplied air and health checks, and nobody enters unprotected until the booth has cleared, which is found by a smoke test.',
  },
  combustible: {
    code: 'combustible',
    text: 'Dust or vapour that can burn sets other rules than this sum: the concentration in the duct, a fan and motor that cannot ignite it, earthing, cleaning. A fire code and a competent person decide.',
  },
};

/** Warnings that say the same whatever the numbers. */
export const FIXED = {
  bench: {
    code: 'from-memory',
    text: 'This equation is from memory. It follows from the plain opening when the bench is taken as a mirror, but no printed source was at hand.',
  },
  hotCanopy: {
    code: 'hot-process',
    text: 'The canopy equation is for a cold process. A hot one throws up a plume that grows as it rises and can need far more air: this result is not for it.',
  },
  coldOnly: {
    code: 'cold-process-only',
    text: 'Only for a cold process. Above a hot one the plume decides, and this result is not for it.',
  },
  hotElsewhere: {
    code: 'hot-process',
    text: 'The equation leaves out the plume that a hot source throws up. Put the hood where the plume goes.',
  },
  breathingZone: {
    code: 'breathing-zone',
    text: 'A canopy draws the air past the face of whoever leans over the work. Take another hood where people do.',
  },
  borrowed: {
    code: 'borrowed-velocity',
    text: 'No primary standard for the openings of laser or printer cabinets was found: the usual 0.51 to 1.02 m/s (100 to 200 fpm) is borrowed from feed and inspection openings. Count every gap and cable hole. Nothing outside the openings is captured.',
  },
} as const satisfies Record<string, Warning>;
