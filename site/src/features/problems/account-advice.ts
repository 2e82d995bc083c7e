import { type Advice } from './advice-shape.ts';

const signIn = { label: 'Sign in', to: '/sign-in' };

/** Sign-in, sessions, roles, and requests that did not get through. */
export const accountAdvice: Record<string, Advice> = {
  'not-signed-in': {
    title: 'Nobody is signed in here',
    means: 'Your session has ended, by its own time or because it was ended elsewhere.',
    steps: [
      'Sign in again; you come back to the page you left.',
      'Answers already saved stay as they are.',
      'If you did not expect this, look at your sessions afterwards and change your passphrase.',
    ],
    link: signIn,
  },
  'sign-in-refused': {
    title: 'That sign-in was refused',
    means:
      'The address, the passphrase or the code is wrong, the address has not been confirmed, or the account is suspended. The answer is the same for each, so that nobody can find out who is registered.',
    steps: [
      'Check the address for slips, and that capitals are not locked.',
      'If you opened the account lately, open the link in the mail first.',
      'A code lasts half a minute and works once: wait for the next one.',
      'Ask for a new passphrase if yours will not come back to you.',
      'If none of this helps, ask the school.',
    ],
    link: { label: 'Ask for a new passphrase', to: '/reset' },
  },
  'second-factor-needed': {
    title: 'A second step is needed',
    means: 'This work needs a code from your authenticator app as well as your passphrase.',
    steps: [
      'Open the app and type the six figures it shows.',
      'Without the phone, use one of your recovery codes; each works once.',
    ],
    link: { label: 'Give the code', to: '/second-factor' },
  },
  'no-enrolment': {
    title: 'There is nothing to confirm',
    means: 'The second step was begun too long ago, or not at all.',
    steps: ['Begin again: the square code first, then the figures of the app that read it.'],
    link: { label: 'To your account', to: '/account' },
  },
  'fresh-sign-in-needed': {
    title: 'Confirm that it is you',
    means: 'This step asks for your passphrase if you gave it more than a quarter of an hour ago.',
    steps: ['Give it where you are asked for it, then take the step again.'],
  },
  'link-not-valid': {
    title: 'That link no longer works',
    means: 'A link in a mail works once and for a limited time, and a newer one replaces it.',
    steps: ['Use the newest mail.', 'Otherwise ask for a new link.'],
    link: { label: 'Ask for a new link', to: '/sign-up/sent' },
  },
  'administrator-exists': {
    title: 'There is an administrator already',
    means: 'The link of the first start makes the first administrator and nobody after that.',
    steps: ['Open an account, then ask the administrator for the role on the people page.'],
    link: { label: 'Open an account', to: '/sign-up' },
  },
  'last-administrator': {
    title: 'The last administrator stays',
    means: 'Without one, nobody could give roles or withdraw a certificate.',
    steps: ['Make somebody else an administrator first.'],
    link: { label: 'To the people', to: '/people' },
  },
  'not-on-oneself': {
    title: 'Not on your own account',
    means: 'Nobody takes their own administrator role or suspends themselves by mistake.',
    steps: ['Ask another administrator to do it.'],
    link: { label: 'To the people', to: '/people' },
  },
  'not-allowed': {
    title: 'This is not yours to open',
    means: 'Your account does not have the role this page or step is for.',
    steps: [
      'Check that you are signed in with the right account.',
      'If the role should be yours, ask an administrator of the school to give it.',
    ],
  },
  'not-found': {
    title: 'There is no such sheet',
    means: 'Nothing is filed under this number, or it is not yours to open.',
    steps: ['Check the number or the link for slips.', 'Begin again from the front page.'],
  },
  'invalid-request': {
    title: 'Something in the form cannot be used',
    means: 'A field is empty, too long or not of the kind that is asked for.',
    steps: ['Go back; the message stands beside each field it is about.'],
  },
  'too-many-attempts': {
    title: 'Too many tries',
    means: 'After several tries the door waits for a while, whoever is knocking.',
    steps: [
      'Wait as long as the message says. Nothing is locked for good.',
      'If it was not you who tried, change your passphrase once you are in.',
    ],
  },
  'cross-site-request': {
    title: 'The request came from elsewhere',
    means: 'Something outside these pages tried to act in your name. Nothing was done.',
    steps: [
      'Load the page again and take the step from there.',
      'If you came from a link you do not trust, tell the school.',
    ],
  },
  'payload-too-large': {
    title: 'That is too large',
    means: 'What was sent is larger than anything this page needs.',
    steps: ['Shorten the text, or choose the right file. A certificate is well under 5 MB.'],
  },
  unavailable: {
    title: 'Not available just now',
    means: 'The server is starting, stopping or very busy. Nothing already saved is lost.',
    steps: ['Wait a minute and try again.'],
  },
};
