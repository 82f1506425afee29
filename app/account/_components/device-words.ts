const browsers = [
  ['Edg', 'Edge'],
  ['OPR', 'Opera'],
  ['SamsungBrowser', 'Samsung Internet'],
  ['Firefox', 'Firefox'],
  ['FxiOS', 'Firefox'],
  ['CriOS', 'Chrome'],
  ['Chrome', 'Chrome'],
  ['Safari', 'Safari'],
] as const;

const systems = [
  ['iPhone', 'an iPhone'],
  ['iPad', 'an iPad'],
  ['Android', 'an Android device'],
  ['Windows', 'Windows'],
  ['Mac OS', 'a Mac'],
  ['CrOS', 'a Chromebook'],
  ['Linux', 'Linux'],
] as const;

/**
 * What a browser says of itself, in plain words; it may say anything, and so this is only a hint.
 *
 * @example deviceWords('Mozilla/5.0 (X11; Linux x86_64; rv:140.0) Gecko/20100101 Firefox/140.0')
 * // 'Firefox on Linux'
 */
export function deviceWords(userAgent: string): string {
  const browser = browsers.find(([sign]) => userAgent.includes(sign))?.[1];
  const system = systems.find(([sign]) => userAgent.includes(sign))?.[1];
  if (browser && system) return `${browser} on ${system}`;
  return browser ?? system ?? 'A device that does not say what it is';
}
