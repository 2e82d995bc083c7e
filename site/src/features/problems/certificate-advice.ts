import { type Advice } from './advice-shape.ts';

/** Certificates after their issue. */
export const certificateAdvice: Record<string, Advice> = {
  'certificate-not-drawn': {
    title: 'The PDF is not ready yet',
    means: 'It is being drawn and signed. That takes a few seconds after a pass.',
    steps: ['Try again in a moment. It also comes by mail.'],
    link: { label: 'To my record', to: '/record' },
  },
  'certificate-withdrawn': {
    title: 'It is withdrawn already',
    means: 'A withdrawal is for good; nothing more can be done to this certificate.',
    steps: ['If it was withdrawn by mistake, the certificate is issued anew.'],
  },
  'certificate-replaced': {
    title: 'It is replaced already',
    means: 'A corrected certificate with another number took its place.',
    steps: ['Look for the new number and act on that one.'],
  },
  'certificate-ended-meanwhile': {
    title: 'Somebody else changed it just now',
    means: 'It was withdrawn or corrected while you were looking at it.',
    steps: ['Load the page again and look at its history.'],
  },
};
