import type { BrowserContext, ConsoleMessage, Request } from 'playwright-core';

export interface Watch {
  /** Says that a complaint is part of what is tested (a page that is not there, a refused form). */
  expectComplaint(pattern: RegExp): void;
  /** Complaints nobody expected, and expected ones that never came. */
  faults(): string[];
}

function fromConsole(message: ConsoleMessage): string[] {
  if (message.type() !== 'error' && message.type() !== 'warning') return [];
  return [`console ${message.type()} on ${message.location().url}: ${message.text()}`];
}

function fromRequest(request: Request, scripts: boolean): string[] {
  const reason = request.failure()?.errorText ?? 'no reason given';
  // With scripts off the browser refuses those a page names beforehand: that is what was asked for.
  if (!scripts && reason === 'csp' && request.resourceType() === 'script') return [];
  // Leaving a page gives up what it was still loading: that is no fault.
  return reason === 'net::ERR_ABORTED' ? [] : [`failed request ${request.method()} ${request.url()}: ${reason}`];
}

/** Records everything every page of a context complains about. */
export function watchContext(context: BrowserContext, scripts: boolean): Watch {
  const complaints: string[] = [];
  const expected: RegExp[] = [];
  context.on('console', (message) => complaints.push(...fromConsole(message)));
  context.on('weberror', (error) => complaints.push(`page error: ${error.error().stack ?? error.error().message}`));
  context.on('requestfailed', (request) => complaints.push(...fromRequest(request, scripts)));
  return {
    expectComplaint: (pattern) => void expected.push(pattern),
    faults: () => [
      ...complaints.filter((complaint) => !expected.some((pattern) => pattern.test(complaint))),
      ...expected.filter((pattern) => !complaints.some((complaint) => pattern.test(complaint))).map((pattern) => `expected and never came: ${pattern}`),
    ],
  };
}
