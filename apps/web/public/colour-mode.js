// Runs before the first paint, as a file of its own because the policy of our pages allows no inline script.
(function () {
  var stored = null;
  try {
    stored = localStorage.getItem('linkfell.colour-mode');
  } catch {
    // Storage may be closed to us; then the system's wish counts.
  }
  var dark = stored === 'dark' || (stored !== 'light' && matchMedia('(prefers-color-scheme: dark)').matches);
  var root = document.documentElement;
  root.classList.add(dark ? 'dark' : 'light');
  root.dataset.theme = dark ? 'dark' : 'light';
})();
