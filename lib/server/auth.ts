import { type AuthOptions } from 'next-auth';
import CredentialsProvider from 'next-auth/providers/credentials';
import { z } from 'zod';
import { signIn } from '@/db/commands/sign-in';
import { Problem } from '@/lib/problem';
import { sessionSecret } from './env';

const Credentials = z.object({ email: z.string().min(3).max(200), password: z.string().min(1).max(200) });

function addressOf(headers: Record<string, unknown> | undefined): string {
  const forwarded = headers?.['x-forwarded-for'];
  return typeof forwarded === 'string' ? (forwarded.split(',')[0] ?? '').trim() : 'direct';
}

/**
 * JWT sessions: the token holds the id and a session version. Role and state are read from the
 * database at every request (`getActor`), so a change of role or a lock works at once.
 */
export function authOptions(): AuthOptions {
  return {
    // unset in development alone, where next-auth makes one of its own
    secret: sessionSecret(),
    session: { strategy: 'jwt', maxAge: 14 * 60 * 60 },
    pages: { signIn: '/sign-in' },
    providers: [
      CredentialsProvider({
        name: 'Rimewright',
        credentials: { email: { type: 'email' }, password: { type: 'password' } },
        async authorize(given, request) {
          const credentials = Credentials.safeParse(given);
          if (!credentials.success) return null;
          try {
            const person = await signIn({ ...credentials.data, address: addressOf(request.headers), now: new Date() });
            return person ? { id: String(person.id), name: person.name, sessionVersion: person.sessionVersion } : null;
          } catch (error) {
            // next-auth hands the message on to the form: a code of ours, never an inner message
            throw new Error(error instanceof Problem ? error.code : 'unexpected');
          }
        },
      }),
    ],
    callbacks: {
      jwt({ token, user }) {
        if (user) return { ...token, personId: Number(user.id), sessionVersion: user.sessionVersion };
        return token;
      },
      session({ session, token }) {
        return { ...session, personId: token.personId, sessionVersion: token.sessionVersion };
      },
    },
  };
}
