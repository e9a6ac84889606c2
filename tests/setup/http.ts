import { inject } from 'vitest';
import { type Person } from './browser';
import './provided';

/** A person's session over HTTP, without a browser: cookies kept by hand. */
export interface Session {
  fetch: (path: string, init?: RequestInit) => Promise<Response>;
}

function cookiesOf(response: Response, jar: Map<string, string>): void {
  for (const line of response.headers.getSetCookie()) {
    const [pair = ''] = line.split(';');
    const [name = '', ...value] = pair.split('=');
    jar.set(name, value.join('='));
  }
}

/** Nobody: no cookie, redirects not followed. */
export function signedOut(): Session {
  return { fetch: (path, init) => fetch(`${inject('baseUrl')}${path}`, { redirect: 'manual', ...init }) };
}

/** Signs in by next-auth's own endpoint; throws when it is refused, with the code the form would show. */
export async function signInOverHttp({ email, password }: Person): Promise<Session> {
  const base = inject('baseUrl');
  const jar = new Map<string, string>();
  const header = () => ({ cookie: [...jar].map(([name, value]) => `${name}=${value}`).join('; ') });
  const csrf = await fetch(`${base}/api/auth/csrf`);
  cookiesOf(csrf, jar);
  const { csrfToken } = (await csrf.json()) as { csrfToken: string };
  const answer = await fetch(`${base}/api/auth/callback/credentials`, {
    method: 'POST',
    redirect: 'manual',
    headers: { ...header(), 'content-type': 'application/x-www-form-urlencoded' },
    body: new URLSearchParams({ email, password, csrfToken, callbackUrl: base, json: 'true' }),
  });
  cookiesOf(answer, jar);
  if (![...jar.keys()].some((name) => name.includes('session-token'))) {
    const { url } = (await answer.json()) as { url: string };
    throw new Error(new URL(url).searchParams.get('error') ?? 'refused');
  }
  return {
    fetch: (path, init = {}) =>
      fetch(`${base}${path}`, {
        redirect: 'manual',
        ...init,
        headers: { ...header(), ...Object.fromEntries(new Headers(init.headers)) },
      }),
  };
}
