/** Where the resident gets mail and texts. */
export const EMAIL = 'ada.reed@post.example';
export const PHONE = '+12085550177';

/** Reads what the local services took in for the resident. */
export function inboxOf(baseUrl) {
  const items = async (url) => {
    const answer = await fetch(baseUrl + url);
    if (!answer.ok) throw new Error(`${url} answered ${answer.status}`);
    return (await answer.json()).items;
  };
  return {
    mails: () => items(`/api/mail?to=${EMAIL}`),
    texts: () => items(`/api/sms?to=${encodeURIComponent(PHONE)}`),
  };
}
