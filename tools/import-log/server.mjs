import { Trouble } from '../process/trouble.mjs';

/** The sentence of a refusal, as problem details tell it. */
async function sentence(response) {
  const body = await response.text();
  try {
    return JSON.parse(body).detail;
  } catch {
    return `The server answered ${response.status}.`;
  }
}

/** A signed-in conversation with the server at `url`. */
export async function signIn({ url, email, password }) {
  let cookie = '';
  const call = async (path, init = {}) => {
    const response = await fetch(new URL(`/api/${path}`, url), {
      ...init,
      headers: { ...init.headers, cookie },
    }).catch(() => {
      throw new Trouble(
        `Nothing answers at ${url}: start it with npm start, or give its address with --url.`,
      );
    });
    if (!response.ok) throw new Trouble(await sentence(response));
    const given = response.headers.getSetCookie().map((one) => one.split(';')[0]);
    if (given.length > 0) cookie = given.join('; ');
    return response.json();
  };
  const headers = { 'content-type': 'application/json' };
  await call('session', { method: 'POST', headers, body: JSON.stringify({ email, password }) });
  return {
    upload: (fields) => {
      const body = new FormData();
      for (const [name, value] of Object.entries(fields)) body.append(name, value);
      return call('imports', { method: 'POST', body });
    },
    read: (id) => call(`imports/${id}`),
    signOut: () => call('session', { method: 'DELETE' }),
  };
}
