/** What a page says as it is served, before any script: its text without scripts and tags. */
export async function servedText(url) {
  const answer = await fetch(url);
  if (!answer.ok) throw new Error(`${url} answered ${answer.status}`);
  const html = await answer.text();
  return html
    .replace(/<(script|style|head)\b[\s\S]*?<\/\1>/g, '')
    .replace(/<[^>]*>/g, ' ')
    .replace(/\s+/g, ' ');
}
