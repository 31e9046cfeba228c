import bcrypt from 'bcryptjs';

export function hash(input: { password: string; cost: number }): string {
  return bcrypt.hashSync(input.password, input.cost);
}

export function compare(input: { password: string; hash: string }): boolean {
  return bcrypt.compareSync(input.password, input.hash);
}
