import { expect, it } from 'vitest';
import { deviceWords } from '@/app/account/_components/device-words';

it.each([
  ['Mozilla/5.0 (X11; Linux x86_64; rv:140.0) Gecko/20100101 Firefox/140.0', 'Firefox on Linux'],
  [
    'Mozilla/5.0 (Windows NT 10.0; Win64; x64) AppleWebKit/537.36 (KHTML, like Gecko) Chrome/140.0 Safari/537.36 Edg/140.0',
    'Edge on Windows',
  ],
  [
    'Mozilla/5.0 (iPad; CPU OS 18_0 like Mac OS X) AppleWebKit/605.1.15 Version/18.0 Mobile Safari/604.1',
    'Safari on an iPad',
  ],
  [
    'Mozilla/5.0 (Linux; Android 15) AppleWebKit/537.36 Chrome/140.0 Mobile Safari/537.36',
    'Chrome on an Android device',
  ],
  ['curl/8.5.0', 'A device that does not say what it is'],
  ['', 'A device that does not say what it is'],
])('says in plain words what a device is: %s', (userAgent, words) => {
  expect(deviceWords(userAgent)).toBe(words);
});
