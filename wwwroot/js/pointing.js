// Script because lighting a dimension under the pointer must not cost a round trip for each field that it crosses.
// The drawings are replaced after each key: one listener stands above all of them, and what is lit is lit again.
export function listen(place) {
  const bench = place.closest("[data-bench]");
  const marks = () => bench.querySelectorAll("[data-drawings] [data-field], [data-drawings] [data-part]");
  const rows = () => bench.querySelectorAll("[data-form] [data-field], [data-row]");
  let lit = null;

  const nameOf = element => {
    const found = element instanceof Element ? element.closest("[data-field], [data-part], [data-row]") : null;
    return found && bench.contains(found) ? found.dataset.field ?? found.dataset.part ?? found.dataset.row : null;
  };
  const isLit = element =>
    lit !== null && (element.dataset.field === lit || element.dataset.part === lit || element.dataset.row === lit);
  const light = () => {
    for (const mark of marks()) mark.classList.toggle("fp-lit", isLit(mark));
    for (const row of rows()) row.toggleAttribute("data-lit", isLit(row));
  };
  const show = name => {
    if (name !== lit) {
      lit = name;
      light();
    }
  };
  // Away from everything, the field that is being typed in stays lit.
  const fallBack = () => show(bench.contains(document.activeElement) ? nameOf(document.activeElement) : null);

  const fieldOf = name => {
    const row = bench.querySelector(`[data-form] [data-field="${CSS.escape(name)}"]`);
    return row?.matches("a, input") ? row : row?.querySelector("input, select, textarea, a, button");
  };
  const goTo = (field, tries) => {
    if (getComputedStyle(field).visibility === "hidden") {
      if (tries > 0) requestAnimationFrame(() => goTo(field, tries - 1));
      return;
    }
    field.focus();
    field.select?.();
  };

  const onOver = event => {
    const name = nameOf(event.target);
    name === null ? fallBack() : show(name);
  };
  const onClick = event => {
    const mark = event.target instanceof Element ? event.target.closest("[data-drawings] [data-field]") : null;
    const field = mark && fieldOf(mark.dataset.field);
    if (!field) return;
    if (getComputedStyle(field).visibility === "hidden") bench.querySelector("[data-form-toggle]").click();
    goTo(field, 60);
  };

  const redrawn = new MutationObserver(() => { if (lit !== null) light(); });
  redrawn.observe(bench, { childList: true, subtree: true });
  bench.addEventListener("pointerover", onOver);
  bench.addEventListener("pointerleave", fallBack);
  bench.addEventListener("focusin", fallBack);
  bench.addEventListener("focusout", fallBack);
  bench.addEventListener("click", onClick);
  return {
    stop: () => {
      redrawn.disconnect();
      bench.removeEventListener("pointerover", onOver);
      bench.removeEventListener("pointerleave", fallBack);
      bench.removeEventListener("focusin", fallBack);
      bench.removeEventListener("focusout", fallBack);
      bench.removeEventListener("click", onClick);
    },
  };
}
