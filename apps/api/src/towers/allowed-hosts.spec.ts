import { isAllowed, notAllowed } from './allowed-hosts';

describe('the hosts that sources may be collected from', () => {
  const hosts = ['loggers.example.org', '192.0.2.7:8080', '[::1]:81'];
  it.each([
    ['http://loggers.example.org/mast.csv', true],
    ['https://LOGGERS.example.org/mast.csv', true],
    ['https://loggers.example.org:443/mast.csv', true],
    ['http://loggers.example.org:8080/mast.csv', false],
    ['http://loggers.example.org.attacker.example/mast.csv', false],
    ['http://sub.loggers.example.org/', false],
    ['http://192.0.2.7:8080/', true],
    ['http://192.0.2.7/', false],
    ['http://[::1]:81/', true],
    ['http://0300.0.2.7:8080/', true],
    ['http://127.0.0.1/', false],
    ['http://localhost/', false],
  ])('%s: %p', (address, allowed) => {
    expect(isAllowed(new URL(address), hosts)).toBe(allowed);
  });

  it('are named in the cure', () => {
    expect(notAllowed(new URL('http://x.example:81/a'))).toMatch(/add x\.example:81 to HTTP_SOURCE_HOSTS/);
  });
});
