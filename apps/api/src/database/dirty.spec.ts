import { openPipeline, type Pipeline } from '../testing/pipeline';
import { UnitOfWork } from './unit-of-work';

describe('what is marked to be worked out', () => {
  let pipeline: Pipeline;
  let work: UnitOfWork;
  beforeEach(async () => {
    pipeline = await openPipeline(1_000_000);
    work = pipeline.work;
  });
  afterEach(() => pipeline.close());

  const mark = (...blocks: [number, number][]) => work.run(() => pipeline.dirty.mark(3, blocks));
  const waiting = () => pipeline.dirty.newest(3, 100, 2_000_000);

  it('stays marked where a change came between reading and settling', async () => {
    await mark([1, 900], [1, 1800]);
    const read = await waiting();
    await mark([1, 900]);
    await work.run(() => pipeline.dirty.settle(3, read));
    expect(await waiting()).toEqual([{ subject: 1, t: 900, gen: 2 }]);
  });

  it('is unmarked only with the transaction of its results', async () => {
    await mark([1, 900]);
    const read = await waiting();
    const failing = work.run(async () => {
      await pipeline.dirty.settle(3, read);
      throw new Error('the results could not be written');
    });
    await expect(failing).rejects.toThrow('the results could not be written');
    expect(await waiting()).toEqual(read);
  });

  it('is worked out one batch after the other, never two at once, and again for what came meanwhile', async () => {
    let [running, most, batches] = [0, 0, 0];
    pipeline.dirty.registerStage(3, async () => {
      running += 1;
      most = Math.max(most, running);
      const rows = await pipeline.dirty.newest(3, 1, 2_000_000);
      if (batches === 1) await mark([7, 2700]);
      await work.run(() => pipeline.dirty.settle(3, rows));
      batches += rows.length;
      running -= 1;
      return rows.length;
    });
    await mark([1, 900], [2, 900]);
    await Promise.all([pipeline.dirty.drain(3), pipeline.dirty.drain(3), pipeline.dirty.drainAll()]);
    expect({ most, batches, left: await waiting() }).toEqual({ most: 1, batches: 3, left: [] });
  });

  it('is worked out to the end by a stage that settles only part of what it reads', async () => {
    const parts: number[] = [];
    pipeline.dirty.registerStage(3, async () => {
      const rows = await pipeline.dirty.newest(3, 100, 2_000_000);
      const part = rows.slice(0, 2);
      parts.push(part.length);
      await work.run(() => pipeline.dirty.settle(3, part));
      return part.length;
    });
    await mark([1, 900], [1, 1800], [1, 2700], [1, 3600], [1, 4500]);
    await pipeline.dirty.drainAll();
    expect(parts).toEqual([2, 2, 1]);
    expect(await waiting()).toEqual([]);
  });
});
