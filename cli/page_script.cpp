#include "gainsay/cli/page_script.h"

namespace gainsay::cli {
namespace {

constexpr std::string_view kScript = R"js(
"use strict";
(() => {
  const numbers = JSON.parse(document.getElementById("numbers").textContent);
  const tip = document.createElement("div");
  tip.className = "reading-of";
  tip.hidden = true;
  document.body.append(tip);
  let near = null;

  const isTicked = (letter) => {
    const box = document.getElementById("tick-" + letter);
    return box !== null && box.checked;
  };

  const leave = () => {
    if (near !== null) near.classList.remove("near");
    near = null;
    tip.hidden = true;
  };

  const wordsOf = (panel, i) => {
    const unit = panel.unit ? " " + panel.unit : "";
    const lines = ["t " + panel.t[i] + (panel.time ? " " + panel.time : ""),
                   panel.v[i] + " ± " + panel.sd[i] + unit];
    for (const letter of Object.keys(panel.shown || {})) {
      if (isTicked(letter) && panel.shown[letter][i] !== "") {
        lines.push(letter + "  " + panel.shown[letter][i]);
      }
    }
    return lines.join("\n");
  };

  const read = (event) => {
    const figure = event.target.closest("figure.panel");
    const panel = figure === null ? undefined : numbers[figure.dataset.panel || figure.id];
    if (panel === undefined) return leave();
    let best = -1, least = 24, found = null;
    figure.querySelectorAll("circle.reading").forEach((circle, i) => {
      const box = circle.getBoundingClientRect();
      const away = Math.hypot(box.x + box.width / 2 - event.clientX,
                              box.y + box.height / 2 - event.clientY);
      if (away < least) { best = i; least = away; found = circle; }
    });
    if (best < 0) return leave();
    if (near !== null) near.classList.remove("near");
    near = found;
    near.classList.add("near");
    tip.textContent = wordsOf(panel, best);
    tip.hidden = false;
    (figure.closest("dialog") || document.body).append(tip);
    const x = Math.min(event.clientX + 14, innerWidth - tip.offsetWidth - 6);
    const y = Math.min(event.clientY + 14, innerHeight - tip.offsetHeight - 6);
    tip.style.transform = "translate(" + x + "px," + y + "px)";
  };

  const dialog = document.createElement("dialog");
  const close = document.createElement("button");
  close.type = "button";
  close.textContent = "close";
  close.addEventListener("click", () => dialog.close());
  dialog.addEventListener("click", (event) => { if (event.target === dialog) dialog.close(); });
  dialog.addEventListener("close", leave);
  document.body.append(dialog);

  const open = (figure) => {
    const large = figure.cloneNode(true);
    large.dataset.panel = figure.id;
    large.removeAttribute("id");
    large.removeAttribute("tabindex");
    large.removeAttribute("role");
    large.removeAttribute("aria-label");
    large.classList.remove("opens");
    const head = figure.closest(".panels");
    const row = head === null ? null : head.previousElementSibling;
    if (row !== null) large.querySelector("figcaption").prepend(row.textContent + ": ");
    dialog.replaceChildren(close, large);
    dialog.setAttribute("aria-label", large.querySelector("figcaption").textContent);
    dialog.showModal();
  };

  document.querySelectorAll("figure.panel[id]").forEach((figure) => {
    figure.classList.add("opens");
    figure.tabIndex = 0;
    figure.setAttribute("role", "button");
    figure.setAttribute("aria-label", "enlarge: " + figure.querySelector("figcaption").textContent);
    figure.addEventListener("click", () => open(figure));
    figure.addEventListener("keydown", (event) => {
      if (event.key !== "Enter" && event.key !== " ") return;
      event.preventDefault();
      open(figure);
    });
  });
  document.addEventListener("pointermove", read);
  document.addEventListener("pointerleave", leave);
})();
)js";

}  // namespace

std::string_view page_script() { return kScript; }

}  // namespace gainsay::cli
