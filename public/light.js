// before the first paint: the light this device was left in
try {
  if (localStorage.getItem("light") === "below") document.documentElement.dataset.light = "below";
} catch {}
