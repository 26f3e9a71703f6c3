/** Answers that belong to the journey: nobody is signed in yet; the second of two officers is told so. */
const EXPECTED = [
  { status: 401, method: 'GET', path: /^\/api\/auth\/me$/ },
  { status: 409, method: 'POST', path: /^\/api\/proposals\/\d+\/issue$/ },
];
/** The service's warnings that belong to the journey: the first link, and those same answers. */
const EXPECTED_LINES = [
  /"context":"FirstAdministrator"/,
  /"path":"\/api\/auth\/me"\},"res":\{"statusCode":401\}/,
  /"path":"\/api\/proposals\/\d+\/issue"\},"res":\{"statusCode":409\}/,
];
const TROUBLE = /"level":[456]0|\bError\b|\bWarning\b|Unhandled|ended by itself/;

/** Adds to `faults` what goes wrong in a window: console, page errors, requests that fail or are refused. */
export function watch(page, faults) {
  page.on('pageerror', (error) => faults.push(`${page.url()}: ${error.message}`));
  page.on('console', (message) => {
    // A refused request is judged below, by its status; the console repeats it without one.
    const repeated = message.text().startsWith('Failed to load resource');
    if (['error', 'warning'].includes(message.type()) && !repeated)
      faults.push(`${page.url()}: ${message.text()}`);
  });
  page.on('requestfailed', (request) => {
    const why = request.failure()?.errorText;
    // Leaving a page calls back what it was still asking for.
    if (why !== 'net::ERR_ABORTED') faults.push(`${request.method()} ${request.url()}: ${why}`);
  });
  page.on('response', (answer) => {
    const [status, method, path] = [
      answer.status(),
      answer.request().method(),
      new URL(answer.url()).pathname,
    ];
    const expected = EXPECTED.some(
      (each) => each.status === status && each.method === method && each.path.test(path),
    );
    if (status >= 400 && !expected) faults.push(`${status} ${method} ${path}`);
  });
  return page;
}

/** The lines in which a program complains of something that does not belong to the journey. */
export const complaints = (said) =>
  said.split('\n').filter((line) => TROUBLE.test(line) && !EXPECTED_LINES.some((each) => each.test(line)));
