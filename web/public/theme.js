// Runs before the first paint, so that a chosen theme does not flash. Inline script is not allowed by our policy.
(function () {
  try {
    var chosen = localStorage.getItem('tubeplate.theme');
    if (chosen === 'light' || chosen === 'dark') document.documentElement.dataset.theme = chosen;
  } catch {
    // Storage may be closed to us; the system's setting then decides.
  }
})();
