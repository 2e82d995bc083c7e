export * from './practice-profile.ts';
