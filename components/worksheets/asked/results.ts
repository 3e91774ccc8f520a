import type { ComponentType } from 'react';
import type { ResultProps } from './answer';
import type { AskedName } from './live-results';
import { ClearingTimeView } from './results/clearing-time';
import { DilutionView } from './results/dilution';
import { DuctPressureView } from './results/duct-pressure';
import { ExposureView } from './results/exposure';
import { FanDutyView } from './results/fan-duty';
import { ReleaseView } from './results/release';
import { RoomBalanceView } from './results/room-balance';

/** How each worksheet shows its result, for the first answer that the server draws. */
export const results: Record<AskedName, ComponentType<ResultProps<never>>> = {
  'duct-pressure': DuctPressureView,
  'fan-duty': FanDutyView,
  'room-balance': RoomBalanceView,
  dilution: DilutionView,
  'clearing-time': ClearingTimeView,
  release: ReleaseView,
  exposure: ExposureView,
};
