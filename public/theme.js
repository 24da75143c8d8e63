// Sets the chosen theme before the first paint. Kept in a file because the policy allows no inline script.
try {
  var chosen = localStorage.getItem('scantling.theme');
  if (chosen === 'day' || chosen === 'night') document.documentElement.dataset.theme = chosen;
} catch (e) {
  // Storage is closed to us: the system's theme it is.
}
