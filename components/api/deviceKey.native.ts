/**
 * A phone app signs with signal only for now: its JavaScript engine has no
 * WebCrypto, and a key that scripts can read would not be a device's own.
 */
export function canKeepKey(): boolean {
  return false;
}

export function makeDeviceKey(): Promise<{ key: CryptoKey; publicKey: JsonWebKey }> {
  return Promise.reject(new Error('No key can be kept here'));
}

export function keepDeviceKey(
  _userId: string,
  _kept: { deviceId: string; key: CryptoKey },
): Promise<void> {
  return Promise.resolve();
}

export function keptDeviceId(_userId: string): Promise<string | undefined> {
  return Promise.resolve(undefined);
}

export function forgetDeviceKey(_userId: string): Promise<void> {
  return Promise.resolve();
}

export function signOnDevice(
  _userId: string,
  _canonical: string,
): Promise<{ deviceId: string; signature: string } | undefined> {
  return Promise.resolve(undefined);
}
