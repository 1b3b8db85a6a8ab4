/**
 * Turns the preference forms into changes on the spot.
 *
 * Theme: at once, then remembered. Units and terms: announced as `ellwise:units` or `ellwise:terms`
 * with the new value as detail. An island that re-renders itself calls `preventDefault()` on the event;
 * if none does, the form is sent as a form and the server draws the page again.
 */
function applyTheme(theme: string): void {
  if (theme === 'system') delete document.documentElement.dataset.theme;
  else document.documentElement.dataset.theme = theme;
}

function announce(name: string, value: string): boolean {
  const event = new CustomEvent(`ellwise:${name}`, { detail: value, cancelable: true });
  return !document.dispatchEvent(event);
}

function press(name: string, value: string): void {
  const buttons = document.querySelectorAll<HTMLButtonElement>(
    `[data-preference="${name}"] button[name]`,
  );
  for (const button of buttons) {
    button.setAttribute('aria-pressed', String(button.value === value));
  }
}

document.addEventListener('submit', (event) => {
  const form = event.target as HTMLFormElement;
  const button = event.submitter as HTMLButtonElement | null;
  const name = form.dataset.preference;
  if (!name || !button) return;

  if (name === 'theme') applyTheme(button.value);
  else if (!announce(name, button.value)) return;

  event.preventDefault();
  press(name, button.value);
  const body = new URLSearchParams([
    ['returnTo', location.pathname],
    [name, button.value],
  ]);
  // The endpoint answers with a redirect, which a plain form would follow; here it only means "kept".
  // Kept alive, so that a choice is not forgotten by whoever goes on to another page at once.
  fetch(form.action, { method: 'POST', body, redirect: 'manual', keepalive: true }).then(
    (response) => {
      if (response.status >= 400) location.reload();
    },
    () => location.reload(),
  );
});
