import type { CDPSession } from 'playwright-core';
import type { Visitor } from '../support/browser';
import { borrowSession, enterAs } from '../support/enter';
import { describePool, sundayEvening } from '../support/households';
import type { Journey } from '../support/journey';
import { Person } from '../support/person';
import { pattern, words } from '../support/words';

/** Somebody adds a passkey, signs in with it, forgets it, and it opens nothing any more. */
export const passkeys: Journey = {
  name: 'passkeys',
  seconds: 150,
  async run(stage) {
    const server = await stage.server({ name: 'passkeys', clock: sundayEvening, byName: true });
    const ines = new Person(server);
    const { password } = await ines.signUp();
    await describePool(ines);
    const visitor = await stage.visitor(server, 'Ines', { width: 390, height: 844 });
    visitor.expect(/status of (401|422)/);
    const { page } = visitor;
    const device = await Device.of(visitor);
    await enterAs(visitor, ines);

    const button = (path: string) => page.getByRole('button', { name: words(path), exact: true });
    const add = async (name: string, word: string) => {
      await page.getByLabel(words('passkeys.account.name'), { exact: true }).fill(name);
      await page.getByLabel(words('passkeys.account.password'), { exact: true }).fill(word);
      await button('passkeys.account.save').click();
    };
    await page.goto('/household');
    await page.waitForLoadState('networkidle');
    await page.getByText(words('passkeys.account.add'), { exact: true }).click();
    await add('Phone', 'not this password');
    await page.getByText('This is not the password you have now.').waitFor();
    stage.equal('without the password none is made', await device.count(), 0);
    await add('Phone', password);
    await page.getByText(words('passkeys.account.saved')).waitFor();
    await page.getByText(words('passkeys.account.notUsed')).waitFor();
    stage.equal('the device has one', await device.count(), 1);

    await stage.part('one device makes no second one', async () => {
      await add('Phone again', password);
      await page.getByText(words('passkeys.problem.known')).waitFor();
      stage.equal('and is left with one', await device.count(), 1);
    });

    const signOut = async () => {
      await borrowSession(visitor, ines);
      await ines.must('POST', '/api/sign-out');
      await visitor.context.clearCookies();
      await page.goto('/sign-in');
      await page.waitForLoadState('networkidle');
    };
    await signOut();
    await stage.part('whoever does not confirm stays outside', async () => {
      await device.confirms(false);
      await button('passkeys.signIn.submit').click();
      await page.getByText(words('passkeys.problem.cancelled')).waitFor();
      await device.confirms(true);
    });
    await button('passkeys.signIn.submit').click();
    await page.waitForURL('**/week');

    await page.goto('/household');
    await page.getByText(pattern('passkeys.account.lastUsed')).waitFor();
    await button('passkeys.account.forget').click();
    await page
      .getByRole('dialog')
      .getByRole('button', { name: words('passkeys.account.forgetYes') })
      .click();
    await button('passkeys.account.forget').waitFor({ state: 'detached' });
    await signOut();
    await button('passkeys.signIn.submit').click();
    await page.getByText('This passkey does not open a sheet here.').waitFor();
    stage.check('and nobody is in', page.url().endsWith('/sign-in'), page.url());

    await stage.part('by its number it offers none, and says why', async () => {
      const numbered = await stage.server({ name: 'passkeys-by-number', clock: sundayEvening });
      const otto = new Person(numbered);
      await otto.signUp();
      await describePool(otto);
      const guest = await stage.visitor(numbered, 'Otto');
      await guest.page.goto('/sign-in');
      stage.equal(
        'no button on the way in',
        await guest.page.getByRole('button', { name: words('passkeys.signIn.submit') }).count(),
        0,
      );
      await enterAs(guest, otto);
      await guest.page.goto('/household');
      await guest.page.getByText(words('passkeys.account.obstacle.number')).waitFor();
      stage.equal('nor one to add it', await guest.page.getByText(words('passkeys.account.add')).count(), 0);
    });
  },
};

/** An authenticator that the browser has built in, which finds its owner by itself. */
class Device {
  private constructor(
    private readonly session: CDPSession,
    private readonly authenticatorId: string,
  ) {}

  static async of({ context, page }: Visitor): Promise<Device> {
    const session = await context.newCDPSession(page);
    await session.send('WebAuthn.enable');
    const { authenticatorId } = await session.send('WebAuthn.addVirtualAuthenticator', {
      options: {
        protocol: 'ctap2',
        transport: 'internal',
        hasResidentKey: true,
        hasUserVerification: true,
        isUserVerified: true,
        automaticPresenceSimulation: true,
      },
    });
    return new Device(session, authenticatorId);
  }

  /** Whether its owner shows a finger when asked. */
  async confirms(isUserVerified: boolean): Promise<void> {
    await this.session.send('WebAuthn.setUserVerified', { authenticatorId: this.authenticatorId, isUserVerified });
  }

  async count(): Promise<number> {
    const { credentials } = await this.session.send('WebAuthn.getCredentials', {
      authenticatorId: this.authenticatorId,
    });
    return credentials.length;
  }
}
