/* global localStorage, matchMedia, document */
/* Sets the theme before anything is painted; `src/theme/theme-choice.ts` writes what this reads. */
(function () {
  function chosen() {
    try {
      return localStorage.getItem('lampwright.theme');
    } catch {
      // Storage can be shut off; light is then what a yard in the sun wants.
      return null;
    }
  }
  var choice = chosen();
  var dark =
    choice === 'dark' ||
    (choice === 'system' && matchMedia('(prefers-color-scheme: dark)').matches);
  document.documentElement.className = dark ? 'dark' : 'light';
  document.documentElement.style.colorScheme = dark ? 'dark' : 'light';
})();
