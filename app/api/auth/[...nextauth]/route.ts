import type { NextRequest } from 'next/server';
import NextAuth from 'next-auth';
import { authOptions } from '@/lib/auth/options';

interface Context {
  params: Promise<{ nextauth: string[] }>;
}

/** The settings are read at the first request, not while the program is built. */
const handler = (request: NextRequest, context: Context): Promise<Response> =>
  NextAuth(request, context, authOptions());

export { handler as GET, handler as POST };
