// Runs before the first paint, so that a dark room is not lit by a white page; hence script and not Blazor.
// Cookies rather than localStorage, because the server draws the first page from them.
window.floodpanel = (() => {
  const year = 31536000;
  const system = matchMedia("(prefers-color-scheme: dark)");
  const read = name => document.cookie.split("; ").find(c => c.startsWith(name + "="))?.slice(name.length + 1);
  const write = (name, value) => document.cookie = `${name}=${value}; path=/; max-age=${year}; samesite=lax`;

  const apply = () => {
    write("fp-system", system.matches ? "dark" : "light");
    const choice = read("fp-theme");
    const dark = choice === "dark" || (choice !== "light" && system.matches);
    document.documentElement.classList.toggle("fp-theme-dark", dark);
    document.documentElement.classList.toggle("fp-theme-light", !dark);
  };

  let listener = null;
  system.addEventListener("change", () => {
    apply();
    listener?.invokeMethodAsync("SystemThemeChanged", system.matches);
  });
  apply();

  return {
    remember: (name, value) => { write(name, value); apply(); },
    watchSystem: target => { listener = target; return system.matches; },
  };
})();
