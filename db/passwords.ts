import { hash, verify } from '@node-rs/argon2';

// OWASP's second recommended argon2id setting: 19 MiB, two passes, one lane.
const settings = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export function hashPassword(password: string): Promise<string> {
  return hash(password, settings);
}

export function passwordMatches(passwordHash: string, password: string): Promise<boolean> {
  return verify(passwordHash, password);
}
