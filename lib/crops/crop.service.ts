import 'server-only';

import { referenceData } from '../reference-data/reference-data';
import type { CropStage } from './crop.schema';

/** The reference by crop and stage. The same for everybody. */
export function listCrops(): CropStage[] {
  return referenceData().crops;
}
