interface Advice {
  title: string;
  means: string;
  steps: string[];
  link?: { label: string; to: string };
}

const bySlug: Record<string, Advice> = {
  'not-signed-in': {
    title: 'Nobody is signed in here',
    means: 'Your session has ended, by its own time or because it was ended elsewhere.',
    steps: [
      'Sign in again; you come back to the page you left.',
      'Answers already saved stay as they are.',
      'If you did not expect this, look at your sessions afterwards and change your passphrase.',
    ],
    link: { label: 'Sign in', to: '/sign-in' },
  },
  'sign-in-refused': {
    title: 'That sign-in was refused',
    means:
      'The address or the passphrase is wrong, the address has not been confirmed, or the account is suspended. The answer is the same for each, so that nobody can find out who is registered.',
    steps: [
      'Check the address for slips, and that capitals are not locked.',
      'If you opened the account lately, open the link in the mail first.',
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
  'second-factor-refused': {
    title: 'That code was refused',
    means: 'A code lasts thirty seconds and works once.',
    steps: [
      'Wait for the next code and type that one.',
      'Check that the phone sets its clock by itself.',
      'Otherwise use a recovery code.',
    ],
    link: { label: 'Give the code', to: '/second-factor' },
  },
  'fresh-sign-in-needed': {
    title: 'Confirm that it is you',
    means:
      'This step cannot be undone, so it asks for your passphrase if you signed in a while ago.',
    steps: ['Give your passphrase where you are asked for it, then take the step again.'],
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
  'link-not-usable': {
    title: 'That link does not work any more',
    means: 'A link in a mail works once and for a limited time, and a newer one replaces it.',
    steps: ['Use the newest mail.', 'Otherwise ask for a new link.'],
    link: { label: 'Ask for a new link', to: '/sign-up/sent' },
  },
  'sitting-closed': {
    title: 'This sitting has closed',
    means: 'The time is over or the paper has been handed in. Answers saved up to then count.',
    steps: ['Open the sitting in your record to see the result.'],
    link: { label: 'To my record', to: '/record' },
  },
  'taken-over': {
    title: 'Another device took this sitting over',
    means: 'A paper is written on one device at a time. This one can read but not write.',
    steps: ['Carry on where you took it over, or take it back here.'],
  },
  'sitting-already-open': {
    title: 'You already have a sitting open',
    means: 'Each person sits one paper at a time.',
    steps: ['Go back to the open sitting and finish it; its clock is running.'],
    link: { label: 'To my record', to: '/record' },
  },
  'wait-not-over': {
    title: 'The waiting time is not over',
    means:
      'Between two sittings of a paper there is a waiting time, so that there is time to study.',
    steps: [
      'The paper’s page says from when you may sit again.',
      'Until then, work the worksheets it names.',
    ],
    link: { label: 'To the course map', to: '/course' },
  },
  'agreement-changed': {
    title: 'The agreement has changed',
    means: 'Since you opened the page, the text you agree to was reissued.',
    steps: ['Load the paper’s page again and read the new text before you begin.'],
  },
  'already-certified': {
    title: 'You hold this certificate already',
    means: 'A paper you have passed is sat again only when its certificate is due for renewal.',
    steps: ['Your certificate is in your record.'],
    link: { label: 'To my record', to: '/record' },
  },
  'result-not-ready': {
    title: 'The result is being made up',
    means: 'Marking runs behind the scenes and takes a few seconds.',
    steps: ['Wait on the result page; it looks again by itself.'],
  },
  'join-code-unknown': {
    title: 'No class has this code',
    means: 'The code may be mistyped, or the class is over.',
    steps: ['Read the code again, letter by letter.', 'Ask your trainer for it.'],
    link: { label: 'To the course map', to: '/course' },
  },
};

const unknown: Advice = {
  title: 'Something did not work',
  means: 'We have no page of advice for this one.',
  steps: [
    'Go back and try once more.',
    'If it happens again, tell the school what you did and quote the number shown with the message.',
  ],
};

export function adviceFor(slug: string): Advice {
  return (Object.hasOwn(bySlug, slug) && bySlug[slug]) || unknown;
}
