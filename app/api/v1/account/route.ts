import { accountChangeSchema } from '@/lib/accounts/account.schema';
import { readAccount, updateAccount } from '@/lib/accounts/account.service';
import { handle } from '@/lib/http/handle';

/** GET /api/v1/account: who is signed in. */
export const GET = handle({ who: 'account' }, async ({ actor }) => readAccount(actor));

/** PATCH /api/v1/account: change the name, the units or the theme. */
export const PATCH = handle({ who: 'account', body: accountChangeSchema }, ({ actor, body }) =>
  updateAccount(actor, body),
);
