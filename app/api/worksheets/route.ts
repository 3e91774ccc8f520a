import { handle, jsonWithEtag } from '@/lib/api/handle';
import { describeWorksheets } from '@/lib/api/describe-worksheets';

export const GET = handle('worksheets', async (request) => jsonWithEtag(request, describeWorksheets()));
