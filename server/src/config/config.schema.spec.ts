import { describe, expect, it } from '@jest/globals';
import { randomBytes } from 'node:crypto';
import { ConfigInvalid, readConfig } from './config.schema.ts';

const secret = () => randomBytes(32).toString('hex');
const complete = () => ({
  PUBLIC_URL: 'https://ferrule.example',
  DATABASE_URL: 'postgres://ferrule_web@db.example/ferrule',
  SESSION_SECRET: secret(),
  DRAW_SECRET: secret(),
  SECOND_FACTOR_KEY: secret(),
  SMTP_URL: 'smtps://mail.example',
  MAIL_FROM: 'office@school.example',
  KEYS_FOLDER: '/var/lib/ferrule/keys',
});

describe('the settings', () => {
  it('are taken when they are complete', () => {
    expect(readConfig(complete())).toMatchObject({ NODE_ENV: 'production', DEMONSTRATION: '0' });
  });

  it.each(Object.keys(complete()))('are refused without %s, which is named', (name) => {
    const settings: Record<string, string> = complete();
    delete settings[name];
    expect(() => readConfig(settings)).toThrow(ConfigInvalid);
    expect(() => readConfig(settings)).toThrow(`  ${name}: `);
  });

  it.each([
    ['PUBLIC_URL', 'http://ferrule.example', 'must be https'],
    ['PUBLIC_URL', 'http://127.0.0.1:4780', 'must be https'],
    ['SESSION_SECRET', '00'.repeat(32), 'must be random'],
    ['SESSION_SECRET', '0123456789abcdef'.repeat(4), 'must be random'],
    ['DRAW_SECRET', 'change-me', 'must be at least 32 random bytes'],
    ['DATABASE_URL', 'mysql://db.example', 'must be a postgres:// address'],
  ])('are refused with %s %s', (name, value, reason) => {
    expect(() => readConfig({ ...complete(), [name]: value })).toThrow(`  ${name}: ${reason}`);
  });

  it('are refused when one secret serves two purposes', () => {
    const shared = secret();
    const settings = { ...complete(), SESSION_SECRET: shared, DRAW_SECRET: shared };
    expect(() => readConfig(settings)).toThrow('  DRAW_SECRET: must be random');
  });

  it('serve plain http only to the demonstration on this machine', () => {
    const demonstration = { ...complete(), DEMONSTRATION: '1' };
    const at = (PUBLIC_URL: string) => () => readConfig({ ...demonstration, PUBLIC_URL });
    expect(at('http://127.0.0.1:4780')).not.toThrow();
    expect(at('http://192.0.2.7:4780')).toThrow('must be https');
  });
});
