/**
 * Passwords of twelve characters or more that are tried first: made by rule from the words,
 * walks over the keyboard and endings that people reach for (common practice), not copied.
 */
export function commonPasswords(): ReadonlySet<string> {
  list ??= new Set(build());
  return list;
}

let list: Set<string> | undefined;

const words = [
  'password',
  'passwort',
  'welcome',
  'letmein',
  'qwerty',
  'qwertz',
  'azerty',
  'iloveyou',
  'admin',
  'administrator',
  'monkey',
  'dragon',
  'sunshine',
  'princess',
  'football',
  'baseball',
  'superman',
  'batman',
  'master',
  'shadow',
  'summer',
  'winter',
  'spring',
  'autumn',
  'secret',
  'changeme',
  'default',
  'company',
  'computer',
  'internet',
  'freedom',
  'whatever',
  'trustno',
  'starwars',
  'michael',
  'jordan',
  'london',
  'liverpool',
  'chelsea',
  'arsenal',
  'mustang',
  'hunter',
  'machine',
  'factory',
  'workshop',
  'production',
  'engineer',
  'manager',
  'torque',
  'fixture',
  'friction',
];
const endings = [
  '1',
  '12',
  '123',
  '1234',
  '12345',
  '123456',
  '1234567',
  '12345678',
  '123456789',
  '!',
  '!!',
  '1!',
  '123!',
  '2020',
  '2021',
  '2022',
  '2023',
  '2024',
  '2025',
  '2026',
  '2027',
  '2024!',
  '2025!',
  '2026!',
  '@123',
  '@1234',
  '#1',
  '01',
  '007',
  '111',
  '1111',
  '000',
  '0000',
  '99',
  '321',
];
const walks = [
  '1234567890',
  'qwertyuiop',
  'qwertzuiop',
  'azertyuiop',
  'asdfghjkl',
  'zxcvbnm',
  '1q2w3e4r5t6z',
  '1q2w3e4r5t6y',
  'qazwsxedcrfv',
  '0987654321',
  'abcdefghijkl',
];

function* build(): Generator<string> {
  for (const text of every()) if ([...text].length >= 12) yield text;
}

function* every(): Generator<string> {
  for (const word of words) {
    for (const ending of endings) {
      yield word + ending;
      yield `${word}${word}${ending}`;
      yield `${word}.${ending}`;
    }
    for (const other of words) yield word + other;
    yield word.repeat(3);
  }
  for (const walk of walks) {
    for (const tail of ['', ...walks, ...endings]) yield walk + tail;
  }
  for (const sign of 'abcdefghijklmnopqrstuvwxyz0123456789') {
    for (let length = 12; length <= 20; length += 1) yield sign.repeat(length);
  }
  yield 'correct horse battery staple';
  yield 'correcthorsebatterystaple';
}
