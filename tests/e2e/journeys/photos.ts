import { randomBytes } from 'node:crypto';
import sharp from 'sharp';
import type { Photo } from '@/lib/schemas/photo';
import { enterAs } from '../support/enter';
import { describePool, sundayEvening } from '../support/households';
import type { Journey } from '../support/journey';
import { Person } from '../support/person';
import { words } from '../support/words';
import { enterFullTest } from './first-week';

const place = 'a place that nobody should read';
const aPicture = () =>
  sharp({ create: { width: 1200, height: 900, channels: 3, background: 'teal' } })
    .jpeg()
    .withExif({ IFD0: { ImageDescription: place } })
    .toBuffer();

/** A photo of a strip, of a label, of equipment: added, seen, taken away; and what is no photo. */
export const photos: Journey = {
  name: 'photos',
  seconds: 120,
  async run(stage) {
    const server = await stage.server({ name: 'photos', clock: sundayEvening });
    const ines = new Person(server);
    await ines.signUp();
    await describePool(ines);
    const visitor = await stage.visitor(server, 'Ines', { width: 1440, height: 1000 });
    const { page } = visitor;
    visitor.expect(/status of 422/);
    await enterAs(visitor, ines);
    const kept = () => ines.must<Photo[]>('GET', '/api/photos');
    const file = page.locator('input[type=file]').first();
    const shown = page.locator('img[src*="/api/photos/"]');
    const picture = { name: 'a.jpg', mimeType: 'image/jpeg', buffer: await aPicture() };

    await page.goto('/week');
    await enterFullTest(stage, page);
    await file.setInputFiles(picture);
    await shown.first().waitFor();
    stage.equal(
      'the strip is kept with its test',
      (await kept()).map(({ kind, about }) => [kind, about !== null]),
      [['strip', true]],
    );

    await page.goto('/pool/shelf');
    await page.waitForLoadState('networkidle');
    await file.setInputFiles(picture);
    await shown.first().waitFor();

    await page.goto('/pool');
    await page.waitForLoadState('networkidle');
    await page.getByLabel(words('photos.caption')).fill('Filter valve');
    await file.setInputFiles(picture);
    await shown.nth(2).waitFor();
    stage.equal(
      'all three are here',
      (await kept()).map(({ kind, caption }) => [kind, caption]),
      [
        ['equipment', 'Filter valve'],
        ['label', null],
        ['strip', null],
      ],
    );
    await shown.first().evaluate((image: HTMLImageElement) => image.decode());
    stage.check('and are pictures', await shown.first().evaluate((image: HTMLImageElement) => image.naturalWidth > 0));

    for (const [what, buffer, sentence] of [
      ['a program', Buffer.concat([Buffer.from('MZ'), randomBytes(400)]), 'This is no photo'],
      ['a script', Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"><script>1</script></svg>'), 'This is no photo'],
      ['half a picture', picture.buffer.subarray(0, 3000), 'not whole'],
      ['too much', Buffer.alloc(9_000_000), 'may have 8 MB'],
    ] as const) {
      await file.setInputFiles({ ...picture, buffer: Buffer.from(buffer) });
      const told = page.getByRole('alert').filter({ hasText: sentence });
      await told.waitFor();
      stage.check(`${what} is refused in words`, await told.isVisible());
    }
    stage.equal('nothing of that is kept', (await kept()).length, 3);

    const [newest] = await kept();
    const address = `/api/photos/${newest?.id}?size=whole`;
    const { text } = await ines.send('GET', address);
    stage.check('without what the camera wrote', !text.includes(place));
    stage.equal('for members only', (await new Person(server).send('GET', address)).status, 401);

    await page.reload();
    await page.waitForLoadState('networkidle');
    await shown.first().click();
    await page.getByRole('button', { name: words('photos.remove'), exact: true }).click();
    await shown.nth(2).waitFor({ state: 'detached' });
    stage.equal('what is taken away is gone', (await ines.send('GET', address)).status, 404);
  },
};
