import { lazy, type ComponentType, type LazyExoticComponent } from 'react';
import type { Ask } from '@/lib/worksheets/ask/fields';
import { clearingTimeAsk } from '@/lib/worksheets/clearing-time/ask';
import { dilutionAsk } from '@/lib/worksheets/dilution/ask';
import { ductPressureAsk } from '@/lib/worksheets/duct-pressure/ask';
import { exposureAsk } from '@/lib/worksheets/exposure/ask';
import { fanDutyAsk } from '@/lib/worksheets/fan-duty/ask';
import { releaseAsk } from '@/lib/worksheets/release/ask';
import { roomBalanceAsk } from '@/lib/worksheets/room-balance/ask';
import type { ResultProps } from './answer';

/** How each worksheet asks, for the form of its page. */
export const asks = {
  'duct-pressure': ductPressureAsk,
  'fan-duty': fanDutyAsk,
  'room-balance': roomBalanceAsk,
  dilution: dilutionAsk,
  'clearing-time': clearingTimeAsk,
  release: releaseAsk,
  exposure: exposureAsk,
} satisfies Record<string, Ask>;
export type AskedName = keyof typeof asks;
export const isAsked = (name: string): name is AskedName => Object.hasOwn(asks, name);

type View = LazyExoticComponent<ComponentType<ResultProps<never>>>;

/** How each shows its result once something was changed: fetched only then. */
export const liveResults: Record<AskedName, View> = {
  'duct-pressure': lazy(() => import('./results/duct-pressure').then((it) => ({ default: it.DuctPressureView }))),
  'fan-duty': lazy(() => import('./results/fan-duty').then((it) => ({ default: it.FanDutyView }))),
  'room-balance': lazy(() => import('./results/room-balance').then((it) => ({ default: it.RoomBalanceView }))),
  dilution: lazy(() => import('./results/dilution').then((it) => ({ default: it.DilutionView }))),
  'clearing-time': lazy(() => import('./results/clearing-time').then((it) => ({ default: it.ClearingTimeView }))),
  release: lazy(() => import('./results/release').then((it) => ({ default: it.ReleaseView }))),
  exposure: lazy(() => import('./results/exposure').then((it) => ({ default: it.ExposureView }))),
};
