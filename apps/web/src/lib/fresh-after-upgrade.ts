const place = 'hidewright-loaded-anew-at';
const pause = 60_000;

/*
 * A page that has been open since before an upgrade asks for parts of the program that are gone. Loaded anew it has
 * those of today; what was typed is kept as a draft. Once a minute at most, so that a part that is really missing
 * comes to the page that says so.
 */
window.addEventListener('vite:preloadError', (event) => {
  const last = Number(sessionStorage.getItem(place) ?? 0);
  if (Date.now() - last < pause) return;
  sessionStorage.setItem(place, String(Date.now()));
  event.preventDefault();
  window.location.reload();
});
