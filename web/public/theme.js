// Runs before the first paint, so that a dark page never flashes light. A file of its own because the content policy
// allows no inline script. `web/src/components/theme.ts` keeps the choice under the same key.
(function () {
  var chosen = null;
  try {
    chosen = localStorage.getItem("restband-theme");
  } catch {
    // Storage is refused: the page follows the system.
  }
  var isDark = chosen ? chosen === "dark" : matchMedia("(prefers-color-scheme: dark)").matches;
  document.documentElement.dataset.theme = isDark ? "dark" : "light";
})();
