/** The API as one signed-in person: a cookie kept by hand, JSON in and out, anything but success thrown. */
export function sessionOf(baseUrl) {
  let cookie = '';
  const send = async (method, url, data) => {
    const answer = await fetch(baseUrl + url, {
      method,
      headers: { Cookie: cookie, Origin: baseUrl, 'Content-Type': 'application/json' },
      ...(data !== undefined && { body: JSON.stringify(data) }),
    });
    cookie = answer.headers.getSetCookie()[0]?.split(';')[0] ?? cookie;
    const text = await answer.text();
    if (!answer.ok) throw new Error(`${method} ${url} answered ${answer.status}: ${text}`);
    return text ? JSON.parse(text) : undefined;
  };
  return {
    get: (url) => send('GET', url),
    post: (url, data = {}) => send('POST', url, data),
    put: (url, data) => send('PUT', url, data),
  };
}
