/**
 * Words that are tried first, without digits and marks around them: a password that is one of these with something
 * before or after it, or said twice, is found at once (OWASP ASVS 4.0.3, 2.1.7, asks to refuse the commonest).
 */
export const commonWords: ReadonlySet<string> = new Set([
  'password', 'passwort', 'passwd', 'pass', 'motdepasse', 'contrasena', 'wachtwoord', 'senha', 'secret', 'letmein', 'welcome', 'login', 'signin', 'admin',
  'administrator', 'changeme', 'changethis', 'default', 'guest', 'user', 'test', 'testing', 'iloveyou', 'loveyou', 'monkey', 'dragon', 'princess', 'sunshine',
  'football', 'baseball', 'basketball', 'superman', 'batman', 'master', 'shadow', 'michael', 'jennifer', 'jordan', 'ashley', 'daniel', 'charlie', 'trustno',
  'whatever', 'freedom', 'starwars', 'pokemon', 'computer', 'internet', 'summer', 'winter', 'spring', 'autumn', 'chocolate', 'cookie', 'cheese', 'kitchen',
  'restaurant', 'chef', 'headchef', 'tamis', 'printer', 'service', 'qwerty', 'qwertz', 'azerty', 'qwertyuiop', 'qwertzuiop', 'azertyuiop', 'asdfghjkl', 'asdf',
  'zxcvbnm', 'yxcvbnm', 'qazwsx', 'qazwsxedc', 'abcdefghijkl', 'abcdefghijklmnop', 'abcdefghijklmnopqrstuvwxyz', 'abc', 'abcd', 'abcdef', 'correcthorsebatterystaple',
]);
