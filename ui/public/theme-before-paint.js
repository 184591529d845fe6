// Runs before the first paint, so that nobody who chose dark sees a white flash. The same choice is read by lib/theme-choice.ts.
(function () {
  var choice = null;
  try {
    choice = localStorage.getItem('brimgate-theme');
  } catch {
    // Storage is closed to us: the system's setting decides.
  }
  var isDark = choice === 'dark' || (choice !== 'light' && window.matchMedia('(prefers-color-scheme: dark)').matches);
  document.documentElement.classList.add(isDark ? 'dark' : 'light');
})();
