/** A client of the service's API that keeps its session. */
export class Client {
  #cookie = '';

  constructor(url) {
    this.url = url;
  }

  /** Sends a request; throws with the problem's own words when it is refused. */
  async request(method, path, { json, text, type, key } = {}) {
    const headers = { origin: this.url, accept: 'application/json' };
    if (key) headers.authorization = `Bearer ${key}`;
    else if (this.#cookie) headers.cookie = this.#cookie;
    if (json !== undefined) headers['content-type'] = 'application/json';
    else if (text !== undefined) headers['content-type'] = type;
    const body = json === undefined ? text : JSON.stringify(json);
    const answer = await fetch(`${this.url}${path}`, { method, headers, body });
    const cookies = answer.headers.getSetCookie().map((cookie) => cookie.split(';')[0]);
    if (cookies.length > 0) this.#cookie = cookies.join('; ');
    const content = await answer.text();
    if (!answer.ok) throw new Error(`${method} ${path} answered ${answer.status}: ${wordsOf(content)}`);
    return content === '' ? undefined : JSON.parse(content);
  }

  get(path) {
    return this.request('GET', path);
  }

  post(path, json) {
    return this.request('POST', path, { json });
  }
}

const wordsOf = (content) => {
  try {
    const { detail, errors } = JSON.parse(content);
    return [detail, ...(errors ?? []).map(({ field, text }) => `${field}: ${text}`)].join(' ');
  } catch {
    return content.slice(0, 300);
  }
};
