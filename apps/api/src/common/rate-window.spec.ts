import { RateWindow } from './rate-window';

describe('what a client may use within a window', () => {
  it('is counted for each, and whole again when the window has gone by', () => {
    const window = new RateWindow(3, 60);
    expect(window.quota('a', 1000)).toEqual({ left: 3, resetS: 60 });
    window.use('a', 1000);
    window.use('a', 1030, 5);
    expect(window.quota('a', 1030)).toEqual({ left: 0, resetS: 30 });
    expect(window.quota('b', 1030)).toEqual({ left: 3, resetS: 60 });
    expect(window.quota('a', 1060)).toEqual({ left: 3, resetS: 60 });
    window.use('a', 1060);
    expect(window.quota('a', 1061)).toEqual({ left: 2, resetS: 59 });
  });

  it('is remembered for ten thousand clients, the latest ones', () => {
    const window = new RateWindow(1, 60);
    for (let i = 0; i <= 10_000; i += 1) window.use(`client ${i}`, 0);
    expect(window.quota('client 0', 0).left).toBe(1);
    expect(window.quota('client 1', 0).left).toBe(0);
  });
});
