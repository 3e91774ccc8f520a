import { CLEARING_TIME_EXAMPLE } from './clearing-time/example';
import { DILUTION_EXAMPLE } from './dilution/example';
import { DUCT_PRESSURE_EXAMPLE } from './duct-pressure/example';
import { EXPOSURE_EXAMPLE } from './exposure/example';
import { FAN_DUTY_EXAMPLE } from './fan-duty/example';
import { RELEASE_EXAMPLE } from './release/example';
import { ROOM_BALANCE_EXAMPLE } from './room-balance/example';

/** An invented question for each worksheet, to look at before one's own. */
export const EXAMPLES: Readonly<Record<string, object>> = {
  'duct-pressure': DUCT_PRESSURE_EXAMPLE,
  'fan-duty': FAN_DUTY_EXAMPLE,
  'room-balance': ROOM_BALANCE_EXAMPLE,
  dilution: DILUTION_EXAMPLE,
  'clearing-time': CLEARING_TIME_EXAMPLE,
  release: RELEASE_EXAMPLE,
  exposure: EXPOSURE_EXAMPLE,
};
