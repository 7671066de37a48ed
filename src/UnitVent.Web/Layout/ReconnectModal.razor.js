// Says when the connection is lost, marks the page as stale, and reloads it as soon as the server answers again.
const modal = document.getElementById("components-reconnect-modal");
const tryEveryMs = 3000;
let waiting = false;

modal.addEventListener("components-reconnect-state-changed", event => {
  const state = event.detail.state;
  document.documentElement.toggleAttribute("data-stale", state !== "hide");
  if (state === "show") {
    const clock = new Intl.DateTimeFormat("en-GB", { hour: "2-digit", minute: "2-digit", timeZone: document.documentElement.dataset.zone });
    document.getElementById("lost-since").textContent = clock.format(new Date());
  }
  if (state === "rejected" || state === "failed" || state === "resume-failed") reloadWhenAlive();
});
document.getElementById("lost-reload").addEventListener("click", () => location.reload());

async function reloadWhenAlive() {
  if (waiting) return;
  waiting = true;
  for (;;) {
    try {
      if ((await fetch("livez", { cache: "no-store" })).ok) return location.reload();
    } catch { /* still away */ }
    await new Promise(resume => setTimeout(resume, tryEveryMs));
  }
}
