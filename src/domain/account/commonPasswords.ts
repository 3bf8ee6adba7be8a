/**
 * Passwords of eight characters and more that many people choose: short roots that are typed with digits and signs
 * around them, and keyboard runs. Common practice, no source; the letters are compared after the digits and signs at
 * both ends are taken off.
 */
export const COMMON_ROOTS: ReadonlySet<string> = new Set(
  `password passwort passord motdepasse contrasena senha passw0rd p@ssword p@ssw0rd pa55word letmein letmeinnow welcome
   willkommen bienvenue welcomeback iloveyou iloveu loveyou loveme trustnoone trustno monkey dragon dragons master
   princess sunshine football footballs baseball basketball superman batman spiderman starwars pokemon minecraft
   fortnite roblox whatever computer internet samsung google facebook instagram michael michelle jennifer jessica
   charlie charlotte daniel jordan thomas matthew ashley nicole anthony freedom shadow hunter ginger pepper summer
   winter autumn spring summertime flower butterfly cheese chocolate cookie banana orange purple yellow secret changeme
   changeit default admin administrator adminadmin root test testing testtest guest user username login abcdefgh
   abcdefghi abcdefghij abcd abcabc aaaaaaaa qwerty qwertyui qwertyuiop qwertz qwertzui qwertzuiop azerty azertyui
   azertyuiop asdfgh asdfghjk asdfghjkl asdfasdf zxcvbn zxcvbnm qazwsx qazwsxedc qweasd qweasdzxc golf golfer golfing
   golfgolf birdie eagle bogey fairway driver holeinone coach coaching athlete junior juniors academy marram liverpool
   arsenal chelsea manchester barcelona england scotland ireland wales london mustang corvette ferrari porsche harley
   killer hello hellohello helloworld goodluck lovely beautiful angel angels family mother father brother sister baby
   babygirl sweetheart darling forever friends bestfriend blink soccer hockey tennis rugby swimming dancing music`.split(
    /\s+/,
  ),
);

/** Runs that no root stands behind. */
export const COMMON_RUNS: readonly string[] = [
  '01234567890123456789',
  '98765432109876543210',
  'abcdefghijklmnopqrstuvwxyz',
  'qwertyuiopasdfghjklzxcvbnm',
  '1qaz2wsx3edc4rfv5tgb6yhn',
  '1q2w3e4r5t6y7u8i9o0p',
  'q1w2e3r4t5y6u7i8o9p0',
  'a1b2c3d4e5f6g7h8i9j0',
];
