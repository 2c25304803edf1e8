/** A compact JWS (RFC 7515): its claims, and whether the signature is the key's. */
export interface JwsReading {
  claims: Record<string, unknown>;
  genuine: boolean;
}

/** Reads a compact JWS signed with ES256 (RFC 7518, 3.4). Null when the text is not one. */
export async function readJws(text: string, verifyKey: Record<string, unknown>): Promise<JwsReading | null> {
  const parts = text.split('.');
  const [header, payload, signature] = parts.map(fromBase64Url);
  if (parts.length !== 3 || !header || !payload || !signature) return null;
  const algorithm = parseRecord(header)?.['alg'];
  const claims = parseRecord(payload);
  if (claims === null) return null;
  const genuine = algorithm === 'ES256' && (await verify(verifyKey, signature, `${parts[0]}.${parts[1]}`));
  return { claims, genuine };
}

async function verify(
  jwk: Record<string, unknown>,
  signature: Uint8Array<ArrayBuffer>,
  signed: string,
): Promise<boolean> {
  try {
    const { kty, crv, x, y } = jwk as JsonWebKey;
    const curve = { name: 'ECDSA', namedCurve: 'P-256' };
    const key = await crypto.subtle.importKey('jwk', { kty, crv, x, y } as JsonWebKey, curve, false, [
      'verify',
    ]);
    const bytes = new TextEncoder().encode(signed);
    return await crypto.subtle.verify({ name: 'ECDSA', hash: 'SHA-256' }, key, signature, bytes);
  } catch (error) {
    // A key that is no key vouches for nothing.
    if (error instanceof DOMException || error instanceof TypeError) return false;
    throw error;
  }
}

function parseRecord(bytes: Uint8Array): Record<string, unknown> | null {
  try {
    const value: unknown = JSON.parse(new TextDecoder().decode(bytes));
    return typeof value === 'object' && value !== null ? (value as Record<string, unknown>) : null;
  } catch {
    return null;
  }
}

function fromBase64Url(text: string): Uint8Array<ArrayBuffer> | null {
  if (!/^[A-Za-z0-9_-]+$/.test(text)) return null;
  const padded = text
    .replaceAll('-', '+')
    .replaceAll('_', '/')
    .padEnd(Math.ceil(text.length / 4) * 4, '=');
  try {
    return Uint8Array.from(atob(padded), (character) => character.charCodeAt(0));
  } catch {
    return null;
  }
}
