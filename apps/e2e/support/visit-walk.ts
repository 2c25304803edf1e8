import type { Page } from 'playwright-core';
import type { TestPicture } from './pictures';

/** A thumb on the screens of one visit: each method does one step and ends on the list of work. */
export class VisitWalk {
  constructor(readonly page: Page) {}

  tap(name: string | RegExp): Promise<void> {
    return this.page.getByRole('button', { name }).first().click();
  }

  /** Types on the number pad. */
  async type(digits: string): Promise<void> {
    for (const digit of digits) await this.page.getByRole('button', { name: digit, exact: true }).click();
  }

  choose(name: string, within?: string): Promise<void> {
    const place = within ? this.page.getByRole('radiogroup', { name: within }) : this.page;
    return place.getByRole('radio', { name, exact: false }).first().click();
  }

  /** Opens a step from the list of work. */
  async step(name: string): Promise<void> {
    await this.page.getByRole('list', { name: 'All steps' }).getByRole('link', { name }).click();
  }

  async back(): Promise<void> {
    await this.page.getByRole('link', { name: 'Back' }).click();
  }

  async attach(label: string, pictures: TestPicture[]): Promise<void> {
    const selector = `input[data-photo="gallery"][aria-label="${label}"]`;
    await this.page.locator(selector).waitFor({ state: 'attached' });
    // By path, as a file picker does it: the megabytes do not travel through the test.
    const devtools = await this.page.context().newCDPSession(this.page);
    const { result } = await devtools.send('Runtime.evaluate', {
      expression: `document.querySelector(${JSON.stringify(selector)})`,
    });
    await devtools.send('DOM.setFileInputFiles', {
      objectId: result.objectId ?? '',
      files: pictures.map(({ path }) => path),
    });
    await devtools.detach();
    for (let number = 1; number <= pictures.length; number += 1) {
      await this.page.getByRole('img', { name: `${label} ${number}`, exact: true }).waitFor();
    }
  }

  async cycle(sign: string): Promise<void> {
    await this.tap('Start air');
    await this.tap('Stop air');
    await this.choose(sign);
  }
}
