// Runs before the first paint: the chosen theme, where one was chosen; the system's otherwise.
try {
  const chosen = localStorage.getItem('tautline-theme');
  if (chosen === 'light' || chosen === 'dark') document.documentElement.dataset.theme = chosen;
} catch {
  // Storage may be closed to us; the system's theme then stands.
}
