import { boxFaults, sidewaysScroll } from '../looks/boxes';
import { foreignColours } from '../looks/colours';
import { foreignFonts } from '../looks/fonts';
import type { Journey } from '../support/journey';

/** A page with one fault of each kind, and beside each its harmless neighbour. */
const planted = `<!doctype html><html lang="en"><title>Faults</title>
<style>
  html { background: #F7F4EC; color: #12303A; font: 16px/20px "Fraunces Variable" }
  body { margin: 0; width: 600px }
  p { margin: 0 }
  .reader { position: absolute; width: 1px; height: 1px; overflow: hidden; clip-path: inset(50%) }
</style>
<p style="color: #ff0000">a colour that is none</p>
<p style="border-bottom: 1px solid rgba(18,48,58,.3)">a border at another strength</p>
<svg width="20" height="20"><path d="M0 0H20V20Z" /></svg>
<p style="font-family: Arial">another family</p>
<p style="font-size: 9px">too small to read</p>
<p style="position: relative; height: 20px"><span style="position: absolute; left: 0">lies under</span><span style="position: absolute; left: 30px">lies over</span></p>
<p style="position: relative; height: 20px"><span style="position: absolute; left: 0">stands</span><span style="position: absolute; left: 200px">beside</span></p>
<div style="height: 12px; overflow: hidden"><p style="padding-top: 6px">cut at its foot</p></div>
<div style="width: 40px; overflow: hidden; white-space: nowrap">cut at its right end</div>
<div style="width: 90px; overflow-x: auto; white-space: nowrap">may be scrolled to its end</div>
<p style="position: absolute; left: 1190px; white-space: nowrap">leaves the page at its side</p>
<span class="reader">only read out, and on top of all the rest</span>
</html>`;

/** The measures of the looks have to find what is wrong, and nothing else. */
export const measuring: Journey = {
  name: 'looks: the measures themselves',
  seconds: 30,
  async run(stage) {
    const page = await stage.browser.newPage({ viewport: { width: 1280, height: 800 } });
    try {
      await page.addInitScript('globalThis.__name ??= (named) => named');
      await page.goto('about:blank');
      await page.setContent(planted);
      await page.evaluate('globalThis.__name ??= (named) => named');
      const reported = (what: string, found: readonly string[], wanted: readonly string[]) => {
        for (const piece of wanted)
          stage.check(
            `${what}: "${piece}" is reported`,
            found.some((each) => each.includes(piece)),
            found,
          );
        stage.equal(`${what}: nothing else is`, found.length, wanted.length);
      };
      reported('colours', await foreignColours(page, 'light'), ['rgb(255, 0, 0)', '0.3', 'rgb(0, 0, 0)']);
      reported('fonts', await foreignFonts(page), ['Arial', '9px', 'is used and not loaded']);
      const { overlaps, clipped } = await boxFaults(page);
      reported('overlaps', overlaps, ['lies over']);
      reported('cut text', clipped, ['cut at its foot', 'cut at its right end', 'leaves the page']);
      stage.check('a page that is too wide is measured', (await sidewaysScroll(page)) > 0);
    } finally {
      await page.close();
    }
  },
};
