// Sets the colour mode before the first paint, so that a dark room does not flash white, and again when the system
// changes. A file of its own because the content security policy allows no inline script. `src/theme/color-mode.ts`
// does the rest.
(function () {
  const systemDark = globalThis.matchMedia('(prefers-color-scheme: dark)');
  function chosen() {
    try {
      return globalThis.localStorage.getItem('color-mode');
    } catch {
      return null; // storage can be forbidden; the system's setting is followed then
    }
  }
  function apply() {
    const dark = (chosen() ?? (systemDark.matches ? 'dark' : 'light')) === 'dark';
    globalThis.document.documentElement.classList.toggle('dark', dark);
  }
  apply();
  systemDark.addEventListener('change', apply);
})();
