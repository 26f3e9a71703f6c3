import { Supply } from './supply';

/** Batches of 1 to `total`, `size` at a time. */
const batches = (total: number, size: number) => {
  let given = 0;
  const fetched: number[] = [];
  const fetch = (): Promise<number[]> => {
    fetched.push(given);
    const length = Math.min(size, total - given);
    const batch = Array.from({ length }, (_, i) => given + i + 1);
    given += length;
    return Promise.resolve(batch);
  };
  return { fetch, fetched };
};

describe('messages in hand', () => {
  it('go to many takers, each once and in order', async () => {
    const supply = new Supply(batches(100, 7).fetch, 3);
    const taken: number[] = [];
    const taker = async (): Promise<void> => {
      for (let one = await supply.next(); one !== undefined; one = await supply.next()) taken.push(one);
    };
    await Promise.all(Array.from({ length: 10 }, taker));
    expect(taken).toEqual(Array.from({ length: 100 }, (_, i) => i + 1));
  });

  it('are fetched before the last one is used up', async () => {
    const { fetch, fetched } = batches(20, 10);
    const supply = new Supply(fetch, 4);
    for (let n = 1; n <= 6; n++) await supply.next();
    expect(fetched).toEqual([0]);
    await supply.next();
    expect(fetched).toEqual([0, 10]);
  });

  it('are given back when it closes, and no more are fetched', async () => {
    const { fetch, fetched } = batches(100, 10);
    const supply = new Supply(fetch, 0);
    await supply.next();
    expect(await supply.close()).toEqual([2, 3, 4, 5, 6, 7, 8, 9, 10]);
    expect(await supply.next()).toBeUndefined();
    expect(fetched).toEqual([0]);
  });

  it('let every taker know when they cannot be fetched', async () => {
    const supply = new Supply<number>(() => Promise.reject(new Error('the store is away')), 0);
    const takers = await Promise.allSettled([supply.next(), supply.next()]);
    expect(takers.map(({ status }) => status)).toEqual(['rejected', 'rejected']);
    expect(await supply.next()).toBeUndefined();
  });
});
