import 'server-only';
import { connection } from '@/lib/database';
import { inventedWorkshopsIn } from './store';

/** The demo's workshops; none where the demo is off. */
export const inventedWorkshops = () => inventedWorkshopsIn(connection());
