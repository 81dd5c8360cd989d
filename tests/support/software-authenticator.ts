import { createHash, generateKeyPairSync, randomBytes, sign } from 'node:crypto';
import { isoCBOR } from '@simplewebauthn/server/helpers';
import type { NewPasskey, PasskeyCreation, PasskeyRequest, PasskeySignIn } from '@/lib/schemas/passkey';

type Sworn = {
  /** The page that the browser says it is on. */
  origin: string;
  /** Whether the device made sure of its owner. */
  verified: boolean;
  challenge: string;
  rpId: string;
  type: string;
};

const sha256 = (bytes: Uint8Array | string) => createHash('sha256').update(bytes).digest();
/** Bits of the standard's flags: somebody was there, it was the owner, a key is attached. */
const flags = { present: 0x01, verified: 0x04, attested: 0x40 };
const count = (number: number, size: 2 | 4) => {
  const bytes = Buffer.alloc(size);
  bytes.writeUIntBE(number, 0, size);
  return bytes;
};

/** A device that makes passkeys and signs with them (ES256), and can be told to do it wrongly. */
export class SoftwareAuthenticator {
  readonly id: string;
  readonly #keys = generateKeyPairSync('ec', { namedCurve: 'P-256' });
  #userHandle = '';
  /** How often it has signed, as it says. */
  counter = 0;

  /** @param origin of the page that it is used on */
  constructor(
    readonly origin: string,
    id = randomBytes(32).toString('base64url'),
  ) {
    this.id = id;
  }

  /** Makes a passkey, without any word about who made the device. */
  create(asked: PasskeyCreation, wrong: Partial<Sworn> & { format?: string } = {}): Omit<NewPasskey, 'name'> {
    this.#userHandle = asked.user.id;
    const id = Buffer.from(this.id, 'base64url');
    const attested = Buffer.concat([Buffer.alloc(16), count(id.length, 2), id, this.#publicKey()]);
    const { challenge, rp } = asked;
    const sworn = { challenge, rpId: rp.id, origin: this.origin, verified: true, type: 'webauthn.create', ...wrong };
    const authData = Buffer.concat([this.#authenticatorData(sworn, flags.attested), attested]);
    const attestation = new Map<string, string | Map<string, string> | Uint8Array>([
      ['fmt', wrong.format ?? 'none'],
      ['attStmt', new Map()],
      ['authData', new Uint8Array(authData)],
    ]);
    return {
      id: this.id,
      clientDataJSON: clientData(sworn).toString('base64url'),
      attestationObject: Buffer.from(isoCBOR.encode(attestation)).toString('base64url'),
      transports: ['internal'],
    };
  }

  /** Signs with it; what is signed can be told apart from what it claims to be. */
  get(asked: PasskeyRequest, wrong: Partial<Sworn & PasskeySignIn> = {}): PasskeySignIn {
    const { challenge, rpId } = asked;
    const sworn = { challenge, rpId, origin: this.origin, verified: true, type: 'webauthn.get', ...wrong };
    const authenticatorData = this.#authenticatorData(sworn);
    const said = clientData(sworn);
    const signed = Buffer.concat([authenticatorData, sha256(said)]);
    return {
      id: wrong.id ?? this.id,
      clientDataJSON: said.toString('base64url'),
      authenticatorData: authenticatorData.toString('base64url'),
      signature: sign('sha256', signed, this.#keys.privateKey).toString('base64url'),
      userHandle: wrong.userHandle ?? this.#userHandle,
    };
  }

  #authenticatorData({ rpId, verified }: Sworn, more = 0): Buffer {
    const flag = flags.present | (verified ? flags.verified : 0) | more;
    return Buffer.concat([sha256(rpId), Buffer.from([flag]), count(this.counter, 4)]);
  }

  /** In COSE form: key type EC2, ES256, curve P-256, x and y. */
  #publicKey(): Buffer {
    const { x = '', y = '' } = this.#keys.publicKey.export({ format: 'jwk' });
    const coordinate = (value: string) => new Uint8Array(Buffer.from(value, 'base64url'));
    const key = new Map<number, number | Uint8Array>([
      [1, 2],
      [3, -7],
      [-1, 1],
      [-2, coordinate(x)],
      [-3, coordinate(y)],
    ]);
    return Buffer.from(isoCBOR.encode(key));
  }
}

function clientData({ type, challenge, origin }: Sworn): Buffer {
  return Buffer.from(JSON.stringify({ type, challenge, origin, crossOrigin: false }));
}
