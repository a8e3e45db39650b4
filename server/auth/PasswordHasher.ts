import argon2 from 'argon2';

export interface HashCost {
  readonly memoryKib: number;
  readonly passes: number;
}

/** argon2id; about 60 ms a password on the machine of 2026. */
export const productionCost: HashCost = { memoryKib: 65_536, passes: 3 };

export class PasswordHasher {
  private standIn: Promise<string> | null = null;

  constructor(private readonly cost: HashCost) {}

  hash(password: string): Promise<string> {
    return argon2.hash(password, {
      type: argon2.argon2id,
      memoryCost: this.cost.memoryKib,
      timeCost: this.cost.passes,
      parallelism: 1,
    });
  }

  /** Unknown addresses cost the same work as known ones, so that the time of the answer tells nothing. */
  async verify(hash: string | null, password: string): Promise<boolean> {
    this.standIn ??= this.hash('nobody has this one');
    const stands = await argon2.verify(hash ?? (await this.standIn), password);
    return hash !== null && stands;
  }
}
