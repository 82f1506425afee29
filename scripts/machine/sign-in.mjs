/** Signs in as the form does, and returns the `Cookie` header of the session. */
export async function signInByForm(address, email, password, { device = 'a script' } = {}) {
  const jar = new Map();
  const keep = (response) => {
    for (const line of response.headers.getSetCookie()) {
      const [pair] = line.split(';');
      jar.set(pair.slice(0, pair.indexOf('=')), pair.slice(pair.indexOf('=') + 1));
    }
  };
  const cookie = () => [...jar].map(([name, value]) => `${name}=${value}`).join('; ');
  const csrf = await fetch(`${address}/api/auth/csrf`);
  keep(csrf);
  const { csrfToken } = await csrf.json();
  const done = await fetch(`${address}/api/auth/callback/credentials`, {
    method: 'POST',
    redirect: 'manual',
    headers: {
      'content-type': 'application/x-www-form-urlencoded',
      'user-agent': device,
      origin: address,
      cookie: cookie(),
    },
    body: new URLSearchParams({ csrfToken, email, password, json: 'true' }),
  });
  keep(done);
  await done.arrayBuffer();
  if (!done.ok) throw new Error(`${email} was refused at ${address}: ${done.status}`);
  return cookie();
}

/**
 * Ends the session of this `Cookie` header, as the form does. `origin` is where people reach the site,
 * when that is not where it is asked.
 */
export async function signOutByForm(address, cookie, origin = address) {
  const csrf = await fetch(`${address}/api/auth/csrf`, { headers: { cookie } });
  const { csrfToken } = await csrf.json();
  const fresh = csrf.headers.getSetCookie().map((line) => line.split(';')[0]);
  const done = await fetch(`${address}/api/auth/signout`, {
    method: 'POST',
    redirect: 'manual',
    headers: {
      'content-type': 'application/x-www-form-urlencoded',
      origin,
      cookie: [cookie, ...fresh].filter(Boolean).join('; '),
    },
    body: new URLSearchParams({ csrfToken, json: 'true' }),
  });
  await done.arrayBuffer();
  if (!done.ok) throw new Error(`Signing out at ${address} was refused: ${done.status}`);
}
