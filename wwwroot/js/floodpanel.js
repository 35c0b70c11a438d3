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

  // Fetched first, so that a refusal becomes a sentence on the page and not a failed file in the download list.
  const download = async address => {
    const answer = await fetch(address);
    if (!answer.ok) return await answer.text();
    const name = /filename\*=UTF-8''([^;]+)/i.exec(answer.headers.get("Content-Disposition") ?? "")?.[1];
    const link = document.createElement("a");
    link.href = URL.createObjectURL(await answer.blob());
    link.download = name ? decodeURIComponent(name) : "";
    link.click();
    setTimeout(() => URL.revokeObjectURL(link.href), 60000);
    return null;
  };

  return {
    download,
    remember: (name, value) => { write(name, value); apply(); },
    watchSystem: target => { listener = target; return system.matches; },
  };
})();
