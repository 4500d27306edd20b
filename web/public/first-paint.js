// Runs before the first paint, so that a chosen theme does not flash. src/lib/theme.ts writes the same key.
try {
  const theme = localStorage.getItem('metewand.theme');
  if (theme === 'light' || theme === 'dark') document.documentElement.dataset.colorMode = theme;
} catch {
  // Storage is closed to us: the page follows the system.
}
