// Sets light or dark before the first paint. A file of its own, because the content policy allows no inline script.
(function () {
  var chosen = null;
  try {
    chosen = globalThis.localStorage.getItem('resistry-theme');
  } catch {
    // Storage can be closed to us (private windows); the system's preference then decides.
  }
  var dark =
    chosen === 'dark' ||
    (chosen !== 'light' && globalThis.matchMedia('(prefers-color-scheme: dark)').matches);
  var theme = dark ? 'dark' : 'light';
  var page = globalThis.document.documentElement;
  page.classList.add(theme);
  page.style.colorScheme = theme;
})();
