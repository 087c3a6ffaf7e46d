/**
 * Words and runs that people choose first. Our own list, from what is commonly known of such lists (no source);
 * only what can reach the least length with a few additions is worth a place.
 */
const COMMON_WORDS = `
  abcdef access account admin administrator airplane america amsterdam andrew angel apple arsenal asdfgh ashley
  austin backup balsa banana barcelona baseball basketball batman beautiful berlin bigdog birthday bismillah
  bitcoin blackcat blink blossom bonjour buster butterfly changeit changeme charlie cheese chelsea chicken chocolate
  christmas classic cocacola coffee computer contrasena cookie corvette cowboy crystal daniel database default diamond
  dolphin donald dragon einstein elephant england eternity everton family fender ferrari fiesta florida flower football
  forever forgot france freedom friend friends fuckyou galaxy garden gandalf garfield george germany ginger glider
  gliding goodluck google grandma guest guitar hallo hannah happiness harley harrypotter hello hockey holiday iceman
  iloveyou internet jackson january jasmine jennifer jessica jesus jordan joshua juventus justin killer kitten
  knuddel laptop letmein liverpool login london lovelove loveme lovely madrid maggie manager manchester marina
  marlboro master matrix matthew mercedes merlin michael michelle microsoft midnight monkey monster mother motorola
  mustang naruto nicole ninja nintendo nothing november october orange pass passwd passwort password patrick peanut
  pepper peter phoenix pilot pokemon porsche prince princess private purple qazwsx qwerty qwertz azerty rainbow ranger
  realmadrid remember rockstar root ronaldo rosebud samantha samsung saturday scooter secret september server shadow
  silver skywalker slipknot snoopy soccer sommer spider spiderman spring starwars steelers summer sunday sunflower
  sunshine superman superstar support sweetheart system target teacher temp tennis test testing thomas thunder tigger
  tinkerbell trustno trustnoone unknown user vanessa vampire victoria volleyball wachtwoord warrior webmaster welcome
  whatever william willkommen windows winter wizard wordpass yankees yellow youandme zxcvbn
`;

const WORDS = new Set(COMMON_WORDS.split(/\s+/).filter(Boolean));

/** Rows of keys, the digits, the alphabet, and the ways fingers run over several rows. */
const RUNS = [
  'abcdefghijklmnopqrstuvwxyz',
  '01234567890123456789',
  'qwertyuiopasdfghjklzxcvbnm',
  'qwertzuiopasdfghjklyxcvbnm',
  'azertyuiopqsdfghjklmwxcvbn',
  '1qaz2wsx3edc4rfv5tgb6yhn7ujm8ik9ol0p',
  '1q2w3e4r5t6y7u8i9o0p',
  'q1w2e3r4t5y6u7i8o9p0',
  'qazwsxedcrfvtgbyhnujmikolp',
  'a1b2c3d4e5f6g7h8i9j0',
].flatMap((run) => [run, [...run].reverse().join('')]);

const LOOKALIKES: Record<string, string> = {
  '@': 'a',
  '4': 'a',
  '3': 'e',
  '1': 'i',
  '!': 'i',
  '0': 'o',
  $: 's',
  '5': 's',
};

const asLetters = (text: string) => text.replace(/[@431!0$5]/g, (sign) => LOOKALIKES[sign] ?? sign);
const isRun = (text: string) => RUNS.some((run) => run.includes(text));
/** One character, or one short group, over and over; a little of it at the end may be cut off. */
const isRepetition = (text: string) => /^(.{1,4}?)\1{2,}.{0,3}$/su.test(text) || /^(.{5,})\1+$/su.test(text);

function isDressedWord(text: string): boolean {
  const bare = text.replace(/^[^\p{L}@$]+|[\d\p{P}\p{S}\s]+$/gu, '');
  return [bare, asLetters(bare), asLetters(text).replace(/[^a-z]/g, '')].some(
    (word) => WORDS.has(word) || (word.length >= 4 && (isRun(word) || isRepetition(word))),
  );
}

/**
 * Whether a password is among the first that anybody would try: a common word with digits or signs about it or in
 * place of letters, a run of keys, a repetition, or the person's own name or address. Upper and lower case count
 * the same.
 * @example isCommonPassword('Password123') // → true
 */
export function isCommonPassword(password: string, own: { name: string; email: string }): boolean {
  const text = password.normalize('NFKC').toLowerCase();
  const packed = text.replace(/[\s\-_.]/g, '');
  const personal = [own.email, own.email.split('@')[0] ?? '', own.name, own.name.replace(/\s/g, '')]
    .map((word) => word.toLowerCase())
    .filter((word) => word.length >= 4);
  const withoutDigits = text.replace(/^\d+|\d+$/g, '');
  if (personal.some((word) => text === word || withoutDigits === word)) return true;
  return (
    [text, packed].some((form) => isRun(form) || isRepetition(form) || isDressedWord(form)) ||
    isTwoWords(packed)
  );
}

/** Two common words in a row, such as “iloveyou” with “monkey”, with or without digits at the end. */
function isTwoWords(text: string): boolean {
  const bare = asLetters(text.replace(/\d+$/, ''));
  for (let cut = 3; cut <= bare.length - 3; cut += 1) {
    if (WORDS.has(bare.slice(0, cut)) && WORDS.has(bare.slice(cut))) return true;
  }
  return false;
}

/** How a common password is refused. */
export const commonPassword = {
  pointer: '#/password',
  detail: 'This password is among the first that others would try. Take another one.',
};
