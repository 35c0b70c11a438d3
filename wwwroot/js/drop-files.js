// Script because the browser opens a dropped file in place of the page unless the drop is refused at once, and because
// only the browser can hand the files of a drop to a file input.
export function listen(inputId, areaId) {
  const input = document.getElementById(inputId);
  const area = document.getElementById(areaId);
  const hasFiles = event => event.dataTransfer?.types.includes("Files");
  const show = held => area.classList.toggle("held", held);

  const over = event => {
    if (!hasFiles(event)) return;
    event.preventDefault();
    event.dataTransfer.dropEffect = "copy";
    show(true);
  };
  const leave = event => { if (event.relatedTarget === null) show(false); };
  const drop = event => {
    if (!hasFiles(event)) return;
    event.preventDefault();
    show(false);
    input.files = event.dataTransfer.files;
    input.dispatchEvent(new Event("change", { bubbles: true }));
  };

  document.addEventListener("dragover", over);
  document.addEventListener("dragleave", leave);
  document.addEventListener("drop", drop);
  return {
    stop: () => {
      document.removeEventListener("dragover", over);
      document.removeEventListener("dragleave", leave);
      document.removeEventListener("drop", drop);
    },
  };
}
