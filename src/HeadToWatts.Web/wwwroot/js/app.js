// The little the browser has to do itself. Everything else happens on the server side of the page.
"use strict";

(function () {
  let opener = null;
  const year = 60 * 60 * 24 * 365;
  const keep = (name, value) => { document.cookie = `${name}=${value};path=/;max-age=${year};samesite=strict`; };

  function toggleTheme() {
    const root = document.documentElement;
    const dark = (root.dataset.theme ?? (matchMedia("(prefers-color-scheme: dark)").matches ? "dark" : "light")) === "dark";
    root.dataset.theme = dark ? "light" : "dark";
    keep("theme", root.dataset.theme);
  }

  // Up and down change the last written digit; with Shift ten times as much.
  function step(event) {
    const input = event.target;
    if (!(input instanceof HTMLInputElement) || !("quantity" in input.dataset)) return;
    if ((event.key !== "ArrowUp" && event.key !== "ArrowDown") || event.altKey || event.ctrlKey || event.metaKey) return;
    const found = /^\s*-?\d+(\.\d+)?/.exec(input.value);
    if (!found) return;
    event.preventDefault();
    const decimals = found[1] ? found[1].length - 1 : 0;
    const by = (event.shiftKey ? 10 : 1) * (event.key === "ArrowUp" ? 1 : -1);
    const next = (Math.round(Number(found[0]) * 10 ** decimals) + by) / 10 ** decimals;
    input.value = next.toFixed(decimals) + input.value.slice(found[0].length);
    input.dispatchEvent(new Event("input", { bubbles: true }));
  }

  document.addEventListener("click", event => {
    if (!(event.target instanceof Element)) return;
    if (event.target.closest("[data-toggle-theme]")) toggleTheme();
    if (event.target.closest("[data-reload]")) location.reload();
    const units = event.target.closest("[data-units]");
    if (units) keep("units", units.dataset.units);
  });
  document.addEventListener("keydown", step);

  // A table copied from a spreadsheet: sent as a stream, because one message may not hold it.
  document.addEventListener("paste", event => {
    const area = event.target instanceof Element ? event.target.closest("[data-paste-rows]") : null;
    const receiver = area && window.headToWatts.receivers.get(area.id);
    const text = event.clipboardData?.getData("text/plain") ?? "";
    if (!receiver || !/[\t\n]/.test(text.trim())) return;
    event.preventDefault();
    receiver.invokeMethodAsync("PastedAsync", DotNet.createJSStreamReference(new TextEncoder().encode(text)));
  });

  // The page is kept in step with a server that was restarted: what was entered is stored there.
  const lost = document.getElementById("components-reconnect-modal");
  lost.addEventListener("components-reconnect-state-changed", event => {
    const state = event.detail.state;
    lost.classList.toggle("failed", state === "failed");
    if (state === "show" && !lost.open) lost.showModal();
    else if (state === "hide" && lost.open) lost.close();
    else if (state === "rejected") location.reload();
  });

  window.headToWatts = {
    // The panel at the side takes the focus and gives it back to the number it was opened from.
    rememberFocus: () => { opener = document.activeElement; },
    returnFocus: () => { if (opener instanceof HTMLElement && opener.isConnected) opener.focus(); },
    receivers: new Map(),
    receivePaste: (id, receiver) => { window.headToWatts.receivers.set(id, receiver); },
    stopReceiving: id => { window.headToWatts.receivers.delete(id); },
    // Tells the page how wide the window is, now and after it was resized.
    watchWidth: receiver => {
      let told = 0, timer = 0;
      const tell = () => {
        const width = document.documentElement.clientWidth;
        if (Math.abs(width - told) < 8) return;
        told = width;
        receiver.invokeMethodAsync("WindowWidthAsync", width).catch(() => removeEventListener("resize", later));
      };
      const later = () => { clearTimeout(timer); timer = setTimeout(tell, 150); };
      addEventListener("resize", later);
      tell();
    },
  };
})();
