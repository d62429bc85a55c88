import { ownHosts } from '../../../server/http/host';

const hosts = (publicUrl: string, isProduction: boolean) =>
  [...ownHosts({ publicUrl, port: 8080, isProduction })].sort();

test('in production the service answers under its public name alone', () => {
  expect(hosts('https://stepwell.example', true)).toEqual([
    'stepwell.example',
    'stepwell.example:443',
  ]);
  expect(hosts('https://Stepwell.example:8443', true)).toEqual(['stepwell.example:8443']);
  expect(hosts('http://[2001:db8::1]:81', true)).toEqual(['[2001:db8::1]:81']);
});

test('elsewhere also under this machine’s own names, at both its ports', () => {
  expect(hosts('http://localhost:8081', false)).toEqual([
    '127.0.0.1:8080',
    '127.0.0.1:8081',
    'localhost:8080',
    'localhost:8081',
  ]);
});
