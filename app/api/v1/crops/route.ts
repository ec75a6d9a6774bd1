import { listCrops } from '@/lib/crops/crop.service';
import { handle } from '@/lib/http/handle';

/** GET /api/v1/crops: the crop reference, every figure with its source and standing. */
export const GET = handle({ who: 'account' }, async () => listCrops());
