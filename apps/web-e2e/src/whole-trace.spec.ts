import { expect, test } from './fixtures';
import { people, stateOf } from './people';
import { TraceWalk } from './trace-walk';
import { TruthfulTrailer } from './truthful-trailer';

test.use({ storageState: stateOf(people.technician) });

const sizes = [
  { name: 'tablet', viewport: { width: 1180, height: 820 } },
  { name: 'phone', viewport: { width: 390, height: 844 } },
];

for (const { name, viewport } of sizes) {
  test.describe(`on a ${name}`, () => {
    test.use({ viewport });

    test('a chafed splice on a flatbed, from complaint to signature', async ({ page }) => {
      const trailer = new TruthfulTrailer('F-204', 'markers', 'front-marker-curb');
      const walk = new TraceWalk(page, trailer);
      await walk.start();
      await walk.sayWhatIsWrong();
      await walk.makeSafe();
      await walk.confirm();
      await walk.narrow();
      await walk.inspect();
      await walk.repair();
      await walk.prove();
      await walk.reconnect();
      await walk.lampCheck();
      await walk.sign();
      await expect(page.getByText('All sent')).toBeVisible();
    });
  });
}
