// Sets the theme before the first paint: what was chosen before, else what the system prefers.
(function () {
  var chosen = null;
  try {
    chosen = localStorage.getItem('locant.theme');
  } catch {
    // storage may be switched off; the system's preference holds then
  }
  var dark = chosen === 'dark' || (chosen !== 'light' && matchMedia('(prefers-color-scheme: dark)').matches);
  document.documentElement.dataset.theme = dark ? 'dark' : 'light';
})();
