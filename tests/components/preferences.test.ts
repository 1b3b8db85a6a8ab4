// @vitest-environment jsdom
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import '../../src/components/preferences';

const page = (name: string, values: string[]) =>
  `<form method="post" action="/preferences" data-preference="${name}">${values
    .map((value) => `<button name="${name}" value="${value}" aria-pressed="false"></button>`)
    .join('')}</form>`;

function press(name: string, value: string): Event {
  const form = document.querySelector<HTMLFormElement>(`[data-preference=${name}]`);
  const submitter = form?.querySelector<HTMLButtonElement>(`[value=${value}]`) ?? null;
  const event = new SubmitEvent('submit', { bubbles: true, cancelable: true, submitter });
  form?.dispatchEvent(event);
  return event;
}
const pressed = (value: string) =>
  [...document.querySelectorAll(`[value=${value}]`)].map((b) => b.getAttribute('aria-pressed'));

const fetched = vi.fn(() => Promise.resolve({ status: 0 }));

beforeEach(() => {
  document.body.innerHTML =
    page('units', ['metric', 'imperial']) +
    page('theme', ['system', 'dark']) +
    page('theme', ['dark']);
  vi.stubGlobal('fetch', fetched);
});
afterEach(() => {
  fetched.mockClear();
  delete document.documentElement.dataset.theme;
});

describe('the preference forms', () => {
  it('change the theme on the spot, in every copy of the switch, and remember it', () => {
    expect(press('theme', 'dark').defaultPrevented).toBe(true);
    expect(document.documentElement.dataset.theme).toBe('dark');
    expect(pressed('dark')).toEqual(['true', 'true']);
    const [, request] = fetched.mock.calls[0] as unknown as [string, { body: URLSearchParams }];
    expect(request.body.get('theme')).toBe('dark');
    press('theme', 'system');
    expect(document.documentElement.dataset.theme).toBeUndefined();
  });

  it('are sent as forms when nothing on the page can change its own units', () => {
    expect(press('units', 'imperial').defaultPrevented).toBe(false);
    expect(fetched).not.toHaveBeenCalled();
  });

  it('leave the page standing when an island takes the new units', () => {
    const take = vi.fn((event: Event) => event.preventDefault());
    document.addEventListener('ellwise:units', take);
    expect(press('units', 'imperial').defaultPrevented).toBe(true);
    document.removeEventListener('ellwise:units', take);
    expect((take.mock.lastCall?.[0] as CustomEvent).detail).toBe('imperial');
    expect(pressed('imperial')).toEqual(['true']);
    expect(fetched).toHaveBeenCalledOnce();
  });
});
