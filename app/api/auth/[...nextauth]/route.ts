import NextAuth from 'next-auth';
import { authOptions } from '@/lib/auth/auth-options';

/** GET, POST /api/auth/*: sign-in and sign-out. */
const handler = (request: Request, context: { params: Promise<{ nextauth: string[] }> }) =>
  NextAuth(authOptions())(request, context);

export { handler as GET, handler as POST };
