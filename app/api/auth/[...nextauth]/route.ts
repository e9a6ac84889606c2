import NextAuth from 'next-auth';
import { authOptions } from '@/lib/server/auth';

type Context = { params: Promise<{ nextauth: string[] }> };

const handler = (request: Request, context: Context) =>
  NextAuth(request as never, context as never, authOptions()) as Promise<Response>;

export { handler as GET, handler as POST };
