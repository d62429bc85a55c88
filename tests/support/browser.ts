import { chromium, type Page } from 'playwright-core';
import { given } from './environment';

interface View {
  /** Width of the window in CSS px. */
  readonly width: number;
  readonly height: number;
  readonly dark?: boolean;
  /** A finger in place of a mouse. */
  readonly touch?: boolean;
}

export interface OpenBrowser {
  readonly page: Page;
  /** What the page complained of so far: console errors and uncaught exceptions. */
  readonly complaints: readonly string[];
  readonly close: () => Promise<void>;
}

/** Nothing but the pages under test goes over the wire, and no first-run dialog stands before. */
const flags = [
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-quic',
  '--disable-sync',
  '--no-default-browser-check',
  '--no-first-run',
];

/** Debian's Chromium with one page of the given size. Chromium's sandbox refuses to run as root. */
export async function openBrowser(view: View): Promise<OpenBrowser> {
  const browser = await chromium.launch({
    executablePath: given('CHROMIUM'),
    chromiumSandbox: process.getuid?.() !== 0,
    args: flags,
  });
  // A context by name: browser.newPage would refuse the second page that axe needs.
  const context = await browser.newContext({
    viewport: { width: view.width, height: view.height },
    colorScheme: view.dark ? 'dark' : 'light',
    hasTouch: view.touch ?? false,
    isMobile: view.touch ?? false,
  });
  const page = await context.newPage();
  const complaints: string[] = [];
  page.on('pageerror', (error) => complaints.push(error.message));
  page.on('console', (message) => {
    if (message.type() === 'error') complaints.push(message.text());
  });
  return { page, complaints, close: () => browser.close() };
}
