import { signUpSchema } from '@/lib/accounts/account.schema';
import { signUp } from '@/lib/accounts/account.service';
import { handle } from '@/lib/http/handle';

/** POST /api/v1/accounts: make an account. */
export const POST = handle({ who: 'anybody', body: signUpSchema, status: 201 }, ({ body, request }) =>
  signUp(body, Object.fromEntries(request.headers)),
);
