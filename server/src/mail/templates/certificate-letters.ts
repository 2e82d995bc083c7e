import type { LetterTemplate } from '../letter.ts';

const certificate = {
  needs: ['holderName', 'number', 'schemeTitle', 'issuedOn', 'expiresOn', 'url', 'registerUrl'],
  facts: [
    ['Number', '{{ number }}'],
    ['Issued', '{{ issuedOn }}'],
    ['Valid until', '{{ expiresOn }}'],
  ],
  tone: 'plain',
  heading: '{{ holderName }}',
  button: { label: 'Open the certificate', url: '{{ url }}' },
  holdsKey: false,
} as const;

/** Letters about a certificate's state. */
export const certificateLetters = {
  'certificate-issued': {
    ...certificate,
    subject: 'Your certificate {{ number }}',
    preview: 'The signed PDF is attached.',
    kicker: 'Certificate issued',
    before: [
      'You are certified: {{ schemeTitle }}. The signed PDF is attached, and the register has you from today.',
    ],
    after: [
      'Anyone can check the number with your family name, without an account: {{ registerUrl }}',
      'Keep the file as it is: opening it changes nothing, but saving it from an editor breaks the signature.',
    ],
    reason: 'You get this mail because a certificate was issued to you.',
  },
  'certificate-corrected': {
    ...certificate,
    needs: [...certificate.needs, 'replaces', 'reason'],
    subject: 'Your corrected certificate {{ number }}',
    preview: 'The signed PDF is attached. It replaces the one before.',
    kicker: 'Certificate corrected',
    before: [
      'This certificate, {{ schemeTitle }}, replaces {{ replaces }}, which the register now shows as replaced. The signed PDF is attached.',
      'What was corrected: {{ reason }}',
    ],
    after: [
      'Anyone can check the number with your family name, without an account: {{ registerUrl }}',
    ],
    reason: 'You get this mail because your certificate was corrected.',
  },
  'certificate-withdrawn': {
    ...certificate,
    needs: ['holderName', 'number', 'schemeTitle', 'issuedOn', 'withdrawnOn', 'reason', 'url'],
    subject: 'Your certificate {{ number }} was withdrawn',
    preview: 'The reason is in the mail.',
    kicker: 'Certificate withdrawn',
    facts: [
      ['Number', '{{ number }}'],
      ['Issued', '{{ issuedOn }}'],
      ['Withdrawn', '{{ withdrawnOn }}'],
    ],
    before: [
      'Your certificate "{{ schemeTitle }}" was withdrawn. From now on the register says so to everyone who checks it.',
      'Reason: {{ reason }}',
    ],
    after: ['You may ask for the decision to be looked at again: reply to this mail.'],
    reason: 'You get this mail because the state of your certificate changed.',
  },
} satisfies Record<string, LetterTemplate>;
