// Runs before the first paint, so that a page never flashes in the other theme.
(() => {
  try {
    const theme = localStorage.getItem('tallyloft.theme');
    if (theme === 'light' || theme === 'lamplight') document.documentElement.dataset.theme = theme;
  } catch {
    // Storage may be closed to us; the system's theme stands.
  }
})();
