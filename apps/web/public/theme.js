// Before the first paint: the theme that was chosen here, or the system's. Not a module, so that nothing flashes.
(function () {
  var dark = window.matchMedia("(prefers-color-scheme: dark)");
  function choose() {
    var chosen = null;
    try {
      chosen = localStorage.getItem("theme");
    } catch {
      // Storage may be refused; then the system decides.
    }
    var theme = chosen === "light" || chosen === "dark" ? chosen : dark.matches ? "dark" : "light";
    document.documentElement.dataset.theme = theme;
  }
  choose();
  dark.addEventListener("change", choose);
  window.addEventListener("themechange", choose);
})();
