import { z } from 'zod';
import { DUCT_KINDS, DUCTS } from '@/lib/air/duct-kind';
import { fittingOf } from '@/lib/air/fitting';
import { airflow, between, MAX_NAME, plain, pressure } from './parts-schema';

/** Limits on a question about ducts, SI. Wider than any shop, and no wider. */
export const MIN_DIAMETER = 0.005;
export const MAX_DIAMETER = 3;
export const MAX_LENGTH = 500;
export const MAX_COMPRESSION = 0.9;
export const MAX_RUNS = 12;
export const MAX_FITTINGS = 12;
export const MAX_LOSS_FACTOR = 100;

const k = plain(0, MAX_LOSS_FACTOR);

/** Some fittings of one kind; one that is not in the table, or has no figure there, needs its loss factor. */
const fitting = z
  .strictObject({
    fitting: z.string().min(1, 'is missing').max(MAX_NAME),
    count: z.number().int('must be a whole number').min(1, 'must be at least 1').max(100, 'must be at most 100'),
    k: k.optional().describe('loss factor on the velocity pressure of the run, in place of the tabled one'),
  })
  .superRefine(({ fitting: code, k: given }, context) => {
    if (given !== undefined || fittingOf(code)?.k !== undefined) return;
    const why = fittingOf(code)
      ? 'is missing: no published figure was found, use the maker’s'
      : 'is missing: this fitting is not in the table';
    context.addIssue({ code: 'custom', path: ['k'], message: why });
  });

export const duct = z
  .strictObject({
    duct: z.enum(DUCTS),
    diameter: between('length', MIN_DIAMETER, MAX_DIAMETER),
    length: between('length', 0, MAX_LENGTH),
    compression: plain(0, MAX_COMPRESSION)
      .optional()
      .describe('how far a flexible hose is pushed together: 0 stretched, 0.15 by 15 %'),
    roughness: between('length', 0, 0.05).optional().describe('m, in place of the one of its kind'),
    fittings: z.array(fitting).max(MAX_FITTINGS).optional(),
  })
  .superRefine((run, context) => {
    if (run.compression && !DUCT_KINDS[run.duct].flexible)
      context.addIssue({ code: 'custom', path: ['compression'], message: 'is for flexible hose only: leave it out' });
    if (run.roughness && run.roughness > run.diameter / 2)
      context.addIssue({ code: 'custom', path: ['roughness'], message: 'must be less than half the diameter' });
  });

export const hood = z.strictObject({ entryLossFactor: k.describe('F, over the velocity pressure in the first run') });
export const runs = z.array(duct).min(1, 'at least one run of duct').max(MAX_RUNS, `at most ${MAX_RUNS} runs`);
export const outlet = z.strictObject({
  k: k.describe('loss beyond that of an open end, on the velocity pressure of the last run'),
});
export const filter = z
  .strictObject({
    clean: pressure.describe('Pa, new'),
    loaded: pressure.optional().describe('Pa, when it is changed'),
    at: airflow.describe('m3/s, that both were measured at'),
  })
  .refine(({ clean, loaded = clean }) => loaded >= clean, {
    path: ['loaded'],
    message: 'must be at least the loss when clean',
  });

/** A hood, its runs, filter and outlet, as every worksheet with a duct asks for them. */
export const ductSystem = { hood, runs, outlet: outlet.optional(), filter: filter.optional() };
export type DuctQuestion = {
  hood: z.infer<typeof hood>;
  runs: z.infer<typeof runs>;
  outlet?: z.infer<typeof outlet>;
  filter?: z.infer<typeof filter>;
};

export const runResult = z.strictObject({
  velocity: z.number().describe('m/s'),
  velocityPressure: z.number().describe('Pa'),
  reynolds: z.number(),
  frictionFactor: z.number().describe('Darcy’s; 0 without flow'),
  friction: z.number().describe('Pa'),
  fittings: z.number().describe('Pa'),
});
