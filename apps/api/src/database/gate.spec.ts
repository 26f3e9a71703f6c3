import { Gate, type Lane } from './gate';

describe('the gate', () => {
  it('lets one in at a time, first come first served', async () => {
    const gate = new Gate();
    const order: number[] = [];
    let inside = 0;
    await Promise.all(
      Array.from({ length: 100 }, async (_, k) => {
        const release = await gate.enter('people');
        inside++;
        expect(inside).toBe(1);
        order.push(k);
        await Promise.resolve();
        inside--;
        release();
      }),
    );
    expect(order).toEqual(Array.from({ length: 100 }, (_, k) => k));
  });

  it('lets people go before bulk', async () => {
    const gate = new Gate();
    const first = await gate.enter('bulk');
    const order: string[] = [];
    const pass = async (lane: Lane, name: string): Promise<void> => {
      const release = await gate.enter(lane);
      order.push(name);
      release();
    };
    const all = [
      pass('bulk', 'bulk 1'),
      pass('bulk', 'bulk 2'),
      pass('people', 'person 1'),
      pass('people', 'person 2'),
    ];
    first();
    await Promise.all(all);
    expect(order).toEqual(['person 1', 'person 2', 'bulk 1', 'bulk 2']);
  });

  it('gives back once, however often it is asked to', async () => {
    const gate = new Gate();
    const first = await gate.enter('people');
    const second = gate.enter('people');
    let third: 'waiting' | 'in' = 'waiting';
    const last = gate.enter('people').then((release) => {
      third = 'in';
      return release;
    });
    first();
    first();
    const release = await second;
    expect(third).toBe('waiting');
    release();
    (await last)();
    expect(third).toBe('in');
  });

  it.each([
    [1000, []],
    [1001, [[1001, 'bulk']]],
  ])('tells of a hold of %d ms: %j', async (heldMs, told) => {
    let nowMs = 0;
    const heard: [number, Lane][] = [];
    const gate = new Gate(
      (held, lane) => heard.push([held, lane]),
      () => nowMs,
    );
    const release = await gate.enter('bulk');
    nowMs = heldMs;
    release();
    expect(heard).toEqual(told);
  });

  it('closes after those who wait, and takes nobody any more', async () => {
    const gate = new Gate();
    const holding = await gate.enter('people');
    const waiting = gate.enter('bulk');
    const closing = gate.close();
    await expect(gate.enter('people')).rejects.toThrow('closing');
    holding();
    (await waiting)();
    await closing;
  });
});
