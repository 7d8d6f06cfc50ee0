/* global document, location, matchMedia */
// Runs before the first paint, as a file of its own because the policy of our pages allows no inline script.
(function () {
  var root = document.documentElement;
  var stored = null;
  try {
    stored = localStorage.getItem('linkfell.colour-mode');
  } catch {
    // Storage may be closed to us; then the system's wish counts.
  }
  var dark = stored === 'dark' || (stored !== 'light' && matchMedia('(prefers-color-scheme: dark)').matches);
  root.classList.add(dark ? 'dark' : 'light');
  root.dataset.theme = dark ? 'dark' : 'light';

  // A server may answer any address with the prerendered front page: then it is not shown, the app draws instead.
  var here = location.pathname.replace(/(.)\/+$/, '$1');
  if (root.dataset.page && root.dataset.page !== here) root.dataset.foreign = '';
})();
