import { gardenParams } from '@/lib/gardens/garden.schema';
import { listMembers } from '@/lib/gardens/member.service';
import { handle } from '@/lib/http/handle';

/** GET /api/v1/gardens/:gardenId/members */
export const GET = handle({ who: 'garden', params: gardenParams }, ({ actor }) => listMembers(actor));
