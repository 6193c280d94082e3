import type { Page } from 'playwright-core';

export interface AllowedResponse {
  status: number;
  /** Fits the address's path. */
  path: RegExp;
}

/** Asking who is signed in is how the client learns that nobody is. */
const ALWAYS_ALLOWED: readonly AllowedResponse[] = [{ status: 401, path: /^\/api\/session$/ }];

/** Chromium repeats every failed response as a console error without saying which; the response itself is judged. */
const ECHO_OF_RESPONSE = /^Failed to load resource/;

export interface PageFaults {
  /** Lets one kind of refusal pass, for a journey that provokes it. */
  allow: (response: AllowedResponse) => void;
  list: () => readonly string[];
}

/** Collects what must not happen on a page: errors, console errors, failed and refused requests. */
export function collectPageFaults(page: Page): PageFaults {
  const faults: string[] = [];
  const allowed = [...ALWAYS_ALLOWED];

  page.on('pageerror', (error) => faults.push(`error on the page: ${error.stack ?? error.message}`));
  page.on('console', (message) => {
    if (message.type() === 'error' && !ECHO_OF_RESPONSE.test(message.text())) {
      faults.push(`console error: ${message.text()}`);
    }
  });
  page.on('requestfailed', (request) => {
    const reason = request.failure()?.errorText ?? 'unknown';
    // Leaving a page calls off what it still asked for.
    if (reason !== 'net::ERR_ABORTED')
      faults.push(`request failed: ${request.method()} ${request.url()} (${reason})`);
  });
  page.on('response', (response) => {
    const status = response.status();
    const { pathname } = new URL(response.url());
    const isAllowed = allowed.some((one) => one.status === status && one.path.test(pathname));
    if (status >= 400 && !isAllowed)
      faults.push(`answered ${status}: ${response.request().method()} ${pathname}`);
  });

  return { allow: (response) => void allowed.push(response), list: () => faults };
}
