/** The built page runs under its own policy: nothing refused, nothing on the console, and what the policy forbids is refused. */

import { expect, type Page, test } from 'playwright/test';

/** Everything the page complains of from now on: refusals of the policy, errors, warnings, requests that failed. */
function complaintsOf(page: Page): string[] {
  const complaints: string[] = [];
  page.on('console', message => {
    if (message.type() === 'error' || message.type() === 'warning') complaints.push(message.text());
  });
  page.on('pageerror', error => complaints.push(error.message));
  page.on('requestfailed', request => complaints.push(`${request.url()} failed`));
  return complaints;
}

test('the page opens without a word on the console and asks nobody else for anything', async ({ page, baseURL }) => {
  const complaints = complaintsOf(page);
  const addresses: string[] = [];
  page.on('request', request => addresses.push(request.url()));
  const response = await page.goto('./');
  await expect(page.getByRole('heading').first()).toBeVisible();
  await page.waitForLoadState('networkidle');
  expect(complaints).toEqual([]);
  const elsewhere = addresses.filter(address => !address.startsWith(baseURL ?? '?') && !/^(data|blob):/.test(address));
  expect(elsewhere).toEqual([]);
  const policy = await page.locator('meta[http-equiv="Content-Security-Policy"]').getAttribute('content');
  expect(response?.headers()['content-security-policy']).toBe(policy);
});

test('the policy refuses inline scripts, inline styles, evaluation and other addresses', async ({ page }) => {
  await page.goto('./');
  const refused = await page.evaluate(async () => {
    const directives: string[] = [];
    document.addEventListener('securitypolicyviolation', event => directives.push(event.effectiveDirective));
    const script = document.createElement('script');
    script.textContent = 'document.title = "taken"';
    const style = document.createElement('style');
    style.textContent = 'body { display: none }';
    document.head.append(script, style);
    document.body.insertAdjacentHTML('beforeend', '<p style="color: red">x</p>');
    await fetch('https://example.org/').catch(() => null);
    // In a turn of its own: what the test itself evaluates is exempt from the policy.
    const evaluated = await new Promise(resolve => {
      setTimeout(() => {
        try {
          resolve(new Function('return true')() === true);
        } catch {
          resolve(false); // the policy's own answer to evaluation
        }
      }, 100);
    });
    return { directives: [...new Set(directives)].sort(), evaluated, title: document.title };
  });
  expect(refused.evaluated).toBe(false);
  expect(refused.title).not.toBe('taken');
  expect(refused.directives).toEqual(
    expect.arrayContaining(['connect-src', 'script-src-elem', 'style-src-attr', 'style-src-elem']),
  );
});
