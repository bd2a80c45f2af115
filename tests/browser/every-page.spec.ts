import { expect, expectAccessible, expectNoSidewaysScroll, signIn, test } from './demo.ts';

const sheet = '/designs/shank-drawer-eighteen-bits';
const paths = [
  '/',
  '/?fits=true',
  '/?q=nothing-like-this',
  sheet,
  '/designs/panel-foot-for-18-mm-panels',
  '/designs/collet-wheel-twelve-places',
  `${sheet}/record`,
  '/share',
  '/share?remixOf=collet-wheel-eight-places&revision=2',
  '/bench',
  '/welcome',
  '/log',
  '/log?whose=club',
  '/review',
  '/review?tab=decided',
  '/review?tab=audit',
  '/notices',
  '/members',
  '/account',
  '/no-such-page',
];

for (const colorScheme of ['light', 'dark'] as const) {
  test(`every page is free of axe findings in ${colorScheme === 'light' ? 'light' : 'lamplight'}`, async ({
    quietPage: page,
  }) => {
    test.setTimeout(300_000);
    await page.emulateMedia({ colorScheme });
    await signIn(page, 'ada');
    for (const width of [1440, 360]) {
      await page.setViewportSize({ width, height: 900 });
      for (const path of paths) {
        await page.goto(path);
        await expectAccessible(page);
        await expectNoSidewaysScroll(page);
        expect(await page.title()).toMatch(/ · Tallyloft$/);
      }
    }
  });
}
