// Loaded before the first paint: a chosen theme must not flash the other one. The page allows no inline script.
try {
  const chosen = localStorage.getItem('upstand.theme');
  if (chosen === 'light' || chosen === 'dark') document.documentElement.dataset.theme = chosen;
} catch {
  // Storage is closed to this page: the system's theme stands.
}
