import { closeOtherSessions } from '@/lib/auth/session';
import { handle } from '@/lib/http/handle';

/** DELETE /api/v1/account/sessions: sign out everywhere, here included. */
export const DELETE = handle({ who: 'account' }, ({ actor }) => closeOtherSessions(actor.accountId));
