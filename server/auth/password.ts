import { hash, verify } from '@node-rs/argon2';

/** argon2id with OWASP's parameters (Password Storage Cheat Sheet, 2023): 19 MiB, 2 passes. */
const argon2id = { algorithm: 2, memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

// The same password typed on another keyboard may arrive composed differently.
const normal = (password: string) => password.normalize('NFKC');

export const hashPassword = (password: string) => hash(normal(password), argon2id);

let nobody: Promise<string> | undefined;

/**
 * Whether the password is the one of the hash. Without a hash it is never right, but takes as
 * long, so that the time of the answer does not tell which accounts exist.
 */
export async function isPassword(storedHash: string | null, password: string): Promise<boolean> {
  nobody ??= hashPassword('nobody has this password');
  const right = await verify(storedHash ?? (await nobody), normal(password));
  return storedHash !== null && right;
}
