const STALLED_MS = 120_000;
const pause = (ms) => new Promise((resolve) => setTimeout(resolve, ms));

/** Sends a file as staff do; gives the upload's id. */
export async function uploadFile(client, towerId, text) {
  const path = `/api/uploads?towerId=${towerId}&name=winter.csv`;
  const { id } = await client.request('POST', path, { text, type: 'application/octet-stream' });
  return id;
}

/** Waits until an upload is imported, whole. */
uploadFile.done = async (client, id, readings) => {
  let [most, since] = [-1, Date.now()];
  for (;;) {
    const { state, fault, bytesDone, importId } = await client.get(`/api/uploads/${id}`);
    if (state === 'done') return checkCounts(await client.get(`/api/imports/${importId}`), readings);
    if (state !== 'running') throw new Error(`The import is ${state}: ${fault}`);
    if (bytesDone > most) [most, since] = [bytesDone, Date.now()];
    if (Date.now() - since > STALLED_MS) throw new Error('The import does not go on.');
    await pause(200);
  }
};

const checkCounts = (counts, readings) => {
  if (counts.new !== readings || counts.refused !== 0)
    throw new Error(`${counts.new} readings are new and ${counts.refused} rows refused, of ${readings}.`);
};
