import { passwordChangeSchema } from '@/lib/accounts/account.schema';
import { changePassword } from '@/lib/accounts/account.service';
import { handle } from '@/lib/http/handle';

/** POST /api/v1/account/password: change the passphrase; every other sign-in ends. */
export const POST = handle({ who: 'account', body: passwordChangeSchema }, ({ actor, body }) =>
  changePassword(actor, body),
);
