// Script because the browser would first undo the text of the field that has the focus; here undo means the last edit
// of the project. Fields that are not part of the project (a search, a dialog) keep the undo of the browser.
export function listen(buttons) {
  const onKey = event => {
    if (!(event.ctrlKey || event.metaKey) || event.altKey) return;
    const key = event.key.toLowerCase();
    const undo = key === "z" && !event.shiftKey;
    const redo = (key === "z" && event.shiftKey) || key === "y";
    if (!undo && !redo) return;
    if (event.target instanceof Element && event.target.closest(".mud-dialog, [data-own-undo]")) return;
    event.preventDefault();
    buttons.invokeMethodAsync(undo ? "Undo" : "Redo");
  };
  document.addEventListener("keydown", onKey, true);
  return { stop: () => document.removeEventListener("keydown", onKey, true) };
}
