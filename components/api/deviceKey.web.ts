import { openDB, type DBSchema, type IDBPDatabase } from 'idb';

interface Kept {
  deviceId: string;
  key: CryptoKey;
}

interface Schema extends DBSchema {
  keys: { key: string; value: Kept };
}

const ALGORITHM = { name: 'ECDSA', namedCurve: 'P-256' } as const;

function database(): Promise<IDBPDatabase<Schema>> {
  return openDB<Schema>('wideberth-keys', 1, {
    upgrade(db) {
      db.createObjectStore('keys');
    },
  });
}

/** Whether this browser can keep a key that never leaves it. */
export function canKeepKey(): boolean {
  return typeof indexedDB !== 'undefined' && globalThis.crypto?.subtle !== undefined;
}

/** A new key pair; the private half can never be read out, not even by this app. */
export async function makeDeviceKey(): Promise<{ key: CryptoKey; publicKey: JsonWebKey }> {
  const pair = await crypto.subtle.generateKey(ALGORITHM, false, ['sign', 'verify']);
  const { kty, crv, x, y } = await crypto.subtle.exportKey('jwk', pair.publicKey);
  return { key: pair.privateKey, publicKey: { kty, crv, x, y } };
}

export async function keepDeviceKey(userId: string, kept: Kept): Promise<void> {
  const db = await database();
  await db.put('keys', kept, userId);
  db.close();
}

/** The id under which the server knows this device for that person. */
export async function keptDeviceId(userId: string): Promise<string | undefined> {
  if (!canKeepKey()) return undefined;
  const db = await database();
  const kept = await db.get('keys', userId);
  db.close();
  return kept?.deviceId;
}

export async function forgetDeviceKey(userId: string): Promise<void> {
  const db = await database();
  await db.delete('keys', userId);
  db.close();
}

function base64url(bytes: ArrayBuffer): string {
  const text = String.fromCharCode(...new Uint8Array(bytes));
  return btoa(text).replace(/\+/g, '-').replace(/\//g, '_').replace(/=+$/, '');
}

/** Signs a canonical text with this device's key: ECDSA P-256 with SHA-256, IEEE P1363, base64url. */
export async function signOnDevice(
  userId: string,
  canonical: string,
): Promise<{ deviceId: string; signature: string } | undefined> {
  const db = await database();
  const kept = await db.get('keys', userId);
  db.close();
  if (kept === undefined) return undefined;
  const bytes = new TextEncoder().encode(canonical);
  const signature = await crypto.subtle.sign({ name: 'ECDSA', hash: 'SHA-256' }, kept.key, bytes);
  return { deviceId: kept.deviceId, signature: base64url(signature) };
}
