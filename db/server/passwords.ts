import { randomBytes, type ScryptOptions, scrypt, timingSafeEqual } from "node:crypto";

/** Memory-hard: 32 MiB for each guess. Source: RFC 7914 §2 (N, r, p); the values are those in common use for sign-in. */
const cost = { N: 2 ** 15, r: 8, p: 1 };
const maxmem = 64 * 1024 * 1024;
const keyLength = 32;

/** A password as it is kept: `scrypt$N$r$p$salt$key`. Each hash says how it was made, so the cost can be raised later. */
export async function passwordHash(password: string): Promise<string> {
  const salt = randomBytes(16);
  const key = await derivedKey(password, salt, cost);
  return ["scrypt", cost.N, cost.r, cost.p, salt.toString("base64url"), key.toString("base64url")].join("$");
}

/** Whether the password is the one that was hashed. No hash at all costs the same time and is never right: nobody learns which accounts exist. */
export async function isPassword(password: string, hash: string | null): Promise<boolean> {
  unknownHash ??= passwordHash(randomBytes(18).toString("base64url"));
  const [scheme, N, r, p, salt, key] = (hash ?? (await unknownHash)).split("$");
  if (scheme !== "scrypt" || !salt || !key) return false;
  const kept = Buffer.from(key, "base64url");
  const given = await derivedKey(password, Buffer.from(salt, "base64url"), { N: Number(N), r: Number(r), p: Number(p) });
  return kept.length === given.length && timingSafeEqual(kept, given) && hash !== null;
}

let unknownHash: Promise<string> | undefined;

// the same letters typed on two systems may be coded in two ways
function derivedKey(password: string, salt: Buffer, options: ScryptOptions): Promise<Buffer> {
  return new Promise((resolve, reject) => {
    scrypt(password.normalize("NFKC"), salt, keyLength, { ...options, maxmem }, (error, key) => (error ? reject(error) : resolve(key)));
  });
}
