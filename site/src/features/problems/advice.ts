import { accountAdvice } from './account-advice.ts';
import { type Advice } from './advice-shape.ts';
import { certificateAdvice } from './certificate-advice.ts';
import { studyAdvice } from './study-advice.ts';

const bySlug: Record<string, Advice> = {
  ...accountAdvice,
  ...studyAdvice,
  ...certificateAdvice,
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
