import { baseUrl, demoPassword } from '@/tests/browser/helpers/browser';

/** Signs in over HTTP as a program with cookies does, and gives the Cookie header of the session. */
export async function httpSession(email: string): Promise<string> {
  const first = await fetch(`${baseUrl}/api/auth/csrf`);
  const { csrfToken } = (await first.json()) as { csrfToken: string };
  const answer = await fetch(`${baseUrl}/api/auth/callback/credentials`, {
    method: 'POST',
    redirect: 'manual',
    headers: { 'content-type': 'application/x-www-form-urlencoded', cookie: cookiesOf(first), origin: baseUrl },
    body: new URLSearchParams({ csrfToken, email, password: demoPassword, json: 'true' }),
  });
  const cookie = cookiesOf(answer);
  if (!cookie.includes('session-token')) throw new Error(`No session for ${email}: ${answer.status}`);
  return cookie;
}

function cookiesOf(answer: Response): string {
  return answer.headers
    .getSetCookie()
    .map((cookie) => cookie.split(';')[0])
    .join('; ');
}
