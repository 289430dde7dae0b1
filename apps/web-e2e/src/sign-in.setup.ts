import { expect, test as setup } from '@playwright/test';
import { people, stateOf } from './people';

for (const person of Object.values(people)) {
  setup(`${person.name} signs in`, async ({ page }) => {
    await page.goto('/');
    await page.getByRole('button', { name: new RegExp(`^Sign in as ${person.name}`) }).click();
    await expect(page.getByRole('heading', { level: 1, name: 'Yard' })).toBeVisible();
    await page.context().storageState({ path: stateOf(person), indexedDB: true });
  });
}
