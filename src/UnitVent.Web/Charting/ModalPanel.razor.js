// Opens the browser's modal dialogue, and gives the focus back to where it was when the panel goes away.
let before = null;

export function open(dialogue) {
  before = document.activeElement;
  dialogue.showModal();
  const first = dialogue.querySelector("input:not([type=hidden]), select, textarea, [data-first]");
  (first ?? dialogue.querySelector("h2"))?.focus();
}

export function focus(id) {
  const element = document.getElementById(id);
  element?.focus();
  element?.scrollIntoView({ block: "nearest" });
}

export function giveBack() {
  if (before?.isConnected) before.focus();
}
