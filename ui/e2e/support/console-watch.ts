import type { Page } from '@playwright/test';

const complaints = new WeakMap<Page, string[]>();

/** Collects what a page complains about: errors thrown, errors logged, what its security policy refused. */
export function watchConsole(page: Page): void {
  const heard: string[] = [];
  complaints.set(page, heard);
  page.on('pageerror', (error) => heard.push(`thrown: ${error.message}`));
  page.on('console', (message) => {
    if (message.type() === 'error' || message.type() === 'warning') heard.push(`${message.type()}: ${message.text()}`);
  });
}

/** A refusal that a test provokes is logged by the browser as well; that alone is no fault of the page. */
const isRefusedRequest = (complaint: string) =>
  /Failed to load resource: the server responded with a status of 4\d\d/.test(complaint);

export const complaintsOf = (page: Page, { refusalsExpected = false } = {}): string[] =>
  (complaints.get(page) ?? []).filter((complaint) => !(refusalsExpected && isRefusedRequest(complaint)));
