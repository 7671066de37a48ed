// What the browser keeps (look, unit), and word of the person's own input, by which idle time is measured.
const year = 31536000;
const sayAtMostEveryMs = 30000;

const keep = (name, value) => { document.cookie = `__Host-${name}=${value}; path=/; max-age=${year}; secure; samesite=strict`; };

export function keepLook(look) {
  keep("look", look);
  document.documentElement.dataset.look = look;
  return look === "dark" || (look === "auto" && matchMedia("(prefers-color-scheme: dark)").matches);
}

export function keepUnit(code, zone) {
  keep("unit", encodeURIComponent(code));
  document.documentElement.dataset.zone = zone;
}

export function watchInput(session) {
  let said = Date.now();
  const say = () => {
    if (Date.now() - said < sayAtMostEveryMs) return;
    said = Date.now();
    session.invokeMethodAsync("Touch").catch(() => { });
    fetch("still-here", { cache: "no-store" }).catch(() => { });
  };
  for (const kind of ["pointerdown", "keydown"]) addEventListener(kind, say, { passive: true });
}
