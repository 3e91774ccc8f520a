import { handle, jsonWithEtag } from '@/lib/api/handle';
import { openApi } from '@/lib/api/openapi';

export const GET = handle('openapi', async (request) => jsonWithEtag(request, openApi()));
