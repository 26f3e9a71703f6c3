import { getExpectedTwilioSignature } from 'twilio/lib/webhooks/webhooks';

const TIMEOUT_MS = 15_000;

/** Posts a form to a hook, signed as the provider signs it. @returns the answer's status and text. */
export const signedPost = async (
  authToken: string,
  url: string,
  form: Record<string, string>,
): Promise<{ status: number; text: string }> => {
  const answer = await fetch(url, {
    method: 'POST',
    headers: {
      'content-type': 'application/x-www-form-urlencoded',
      'x-twilio-signature': getExpectedTwilioSignature(authToken, url, form),
    },
    body: new URLSearchParams(form).toString(),
    signal: AbortSignal.timeout(TIMEOUT_MS),
    redirect: 'error',
  });
  return { status: answer.status, text: await answer.text() };
};
