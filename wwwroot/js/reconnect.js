// Shown while the connection is down, before any component could run: hence script and not Blazor.
(() => {
  const dialog = document.getElementById("components-reconnect-modal");
  if (!dialog) return;

  const say = what => dialog.dataset.state = what;

  const retry = async () => {
    say("trying");
    try {
      // False: the server is there but no longer knows this page (it was started anew). What was saved is in the store.
      if (!await Blazor.reconnect()) location.reload();
    } catch {
      say("failed");
    }
  };

  dialog.addEventListener("components-reconnect-state-changed", event => {
    switch (event.detail.state) {
      case "show": say("trying"); if (!dialog.open) dialog.showModal(); break;
      case "hide": dialog.close(); break;
      case "failed": say("failed"); break;
      case "rejected": location.reload(); break;
    }
  });
  dialog.addEventListener("cancel", event => event.preventDefault());
  dialog.querySelector("[data-reconnect]").addEventListener("click", retry);
  document.addEventListener("visibilitychange", () => {
    if (document.visibilityState === "visible" && dialog.open && dialog.dataset.state === "failed") retry();
  });
})();
