/**
 * What is tried first when somebody guesses: the department's own choice, from common knowledge and not from a published list.
 * A passphrase that is nothing but such pieces, one after another, is refused; among other words they do no harm.
 */
const firstTried = `
password passwort passphrase passcode pass word pwd secret letmein letme in open sesame welcome hello hallo admin administrator root user guest login logon signin
default changeme change me test testing tester temp temporary demo example sample qwerty qwertz azerty qwert asdf asdfgh asdfghjkl zxcv zxcvbn zxcvbnm yxcvbnm
poiuyt lkjhgf mnbvcx qazwsx edcrfv qaz wsx iloveyou love you loveme lovely baby angel princess sunshine shadow master monkey dragon football baseball basketball
soccer hockey tennis batman superman spiderman starwars pokemon naruto michael jordan jennifer jessica ashley daniel thomas charlie andrew robert matthew joshua
george william james john david maria anna summer winter spring autumn fall january february march april may june july august september october november december
monday tuesday wednesday thursday friday saturday sunday computer internet google facebook access trustno1 whatever freedom flower cookie cheese pepper ginger
computer1 money lucky blessed jesus god heaven mother father family friends forever purple orange yellow silver golden killer hunter ranger buster tigger
correcthorsebatterystaple correct horse battery staple thequickbrownfoxjumpsoverthelazydog the quick brown fox jumps over lazy dog tobeornottobe to be or not
donttellanyone iamthebest mypassword my passphrase is this thisismypassword ilovemyfamily nothing something everything imagine
`
/** Words that anyone in this trade would think of. */
const ofTheDepartment = `
tetherhouse tethersonde tether sonde sondes weather meteorology meteo atmosphere atmospheric atmos science sciences climate cloud clouds wind winds storm thunder lightning rain snow
temperature pressure humidity sounding soundings balloon station rooftop roof winch lapse rate lapserate inversion parcel adiabatic potential lab labs laboratory
university college campus school department dept faculty course courses class student students teacher instructor professor lecturer ta teaching assistant technician term semester
`

const pieces = [...new Set([...firstTried.split(/\s+/), ...ofTheDepartment.split(/\s+/)])].filter(piece => piece !== '').sort((a, b) => b.length - a.length)
const rows = ['abcdefghijklmnopqrstuvwxyz', '01234567890', 'qwertyuiop', 'qwertzuiop', 'asdfghjkl', 'zxcvbnm', 'yxcvbnm', 'azertyuiop', 'qsdfghjklm', 'wxcvbn', '1qaz2wsx3edc4rfv5tgb6yhn7ujm']
const runs = rows.flatMap(row => [row, [...row].reverse().join('')])

/** Letters that a guesser puts a figure or a sign for. */
const unmasked: Record<string, string> = { '0': 'o', '1': 'i', '3': 'e', '4': 'a', '5': 's', '7': 't', '@': 'a', '$': 's', '!': 'i' }

/** True when nothing but common pieces, runs, repetitions and the person's own name or address make up the passphrase. */
export function isCommonPassphrase(passphrase: string, own: readonly string[] = []): boolean {
  const lower = passphrase.normalize('NFKC').toLowerCase()
  if (new Set(lower).size < 5) return true
  const ownPieces = own.flatMap(text => text.toLowerCase().split(/[^\p{L}\p{N}]+/u)).filter(piece => piece.length >= 3)
  const known = [...ownPieces, ...pieces].sort((a, b) => b.length - a.length)
  const plain = lower.replace(/[^\p{L}\p{N}]/gu, '')
  const letters = [...lower].map(sign => unmasked[sign] ?? sign).join('').replace(/[^\p{L}\p{N}]/gu, '')
  return isRepetition(plain) || leftOver(plain, known) < 5 || leftOver(letters, known) < 5
}

/** How many characters stay when every common piece and run is taken out, from the left. */
function leftOver(text: string, known: readonly string[]): number {
  let left = 0
  for (let at = 0; at < text.length;) {
    const rest = text.slice(at)
    const piece = known.find(one => rest.startsWith(one))
    const taken = Math.max(piece?.length ?? 0, runLength(rest), repeatedLength(rest))
    if (taken === 0) left++
    at += Math.max(taken, 1)
  }
  return left
}

function runLength(text: string): number {
  for (let length = Math.min(text.length, 20); length >= 3; length--) if (runs.some(run => run.includes(text.slice(0, length)))) return length
  return 0
}

function repeatedLength(text: string): number {
  let length = 1
  while (length < text.length && text[length] === text[0]) length++
  return length >= 3 ? length : 0
}

/** The same up to eight characters over and over. */
function isRepetition(text: string): boolean {
  for (let size = 1; size <= 8 && size * 2 <= text.length; size++) if (text === text.slice(0, size).repeat(Math.ceil(text.length / size)).slice(0, text.length)) return true
  return false
}
