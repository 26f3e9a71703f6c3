// Sets the colour mode before the first paint, so that a dark room does not flash white. A file of its own because
// the content security policy allows no inline script. `src/theme/color-mode.ts` does the rest.
(function () {
  var chosen = null;
  try {
    chosen = localStorage.getItem('color-mode');
  } catch (error) {
    chosen = null; // storage can be forbidden; the system's setting is followed then
  }
  var dark = chosen ? chosen === 'dark' : matchMedia('(prefers-color-scheme: dark)').matches;
  document.documentElement.classList.toggle('dark', dark);
})();
