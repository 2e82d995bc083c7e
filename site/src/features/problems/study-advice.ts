import { type Advice } from './advice-shape.ts';

const toRecord = { label: 'To my record', to: '/record' };
const toMap = { label: 'To the course map', to: '/course' };

/** Lessons, worksheets, classes and papers. */
export const studyAdvice: Record<string, Advice> = {
  'already-in-class': {
    title: 'You are in this class already',
    means: 'A join code is used once by each person.',
    steps: ['Nothing more to do: the course map is yours.'],
    link: toMap,
  },
  'class-not-possible': {
    title: 'No class can be opened yet',
    means: 'A class belongs to a school and follows a published course; one of them is missing.',
    steps: ['Publish the lessons and enter the school where the server is run, then try again.'],
  },
  'join-code-unknown': {
    title: 'No class has this code',
    means: 'The code may be mistyped, or the class is over.',
    steps: ['Read the code again, letter by letter.', 'Ask your trainer for it.'],
    link: toMap,
  },
  'answer-unclear': {
    title: 'Some answers cannot be read',
    means: 'Nothing has been marked and nothing is used up.',
    steps: ['Go back; beside each such answer stands what it might mean. Say which.'],
  },
  'lesson-revised': {
    title: 'A newer revision is out',
    means: 'The sheet was reissued while you were reading.',
    steps: ['Load it again and read what has changed, then mark it done.'],
    link: toMap,
  },
  'practice-answered': {
    title: 'This question is marked already',
    means: 'Each set of figures is marked once.',
    steps: ['Take the question again; it comes with fresh figures.'],
  },
  'worksheet-handed-in': {
    title: 'This worksheet is handed in',
    means: 'A marked worksheet stays as it was handed in.',
    steps: ['Look at the marked sheet, or take the worksheet again with fresh figures.'],
    link: toMap,
  },
  'sitting-closed': {
    title: 'This paper has been handed in',
    means: 'The time is over or you handed it in. Answers saved up to then count.',
    steps: ['Open the sitting in your record to see the result.'],
    link: toRecord,
  },
  'taken-over': {
    title: 'Another device took this sitting over',
    means: 'A paper is written on one device at a time. This one can read but not write.',
    steps: ['Carry on where you took it over, or take it back here.'],
    link: toRecord,
  },
  'sequence-used': {
    title: 'Another answer has this place',
    means: 'Two windows wrote to the same sitting. The later answer stands.',
    steps: ['Close the other window, load the sitting again and look at the answer.'],
    link: toRecord,
  },
  'sitting-already-open': {
    title: 'You have a paper open already',
    means: 'Each person sits one paper at a time.',
    steps: ['Go back to the open sitting and finish it; its clock is running.'],
    link: toRecord,
  },
  'wait-not-over': {
    title: 'The waiting time is not over',
    means:
      'Between two sittings of a paper there is a waiting time, so that there is time to study.',
    steps: [
      'The paper’s page says from when you may sit again.',
      'Until then, work the worksheets it names.',
    ],
    link: toMap,
  },
  'agreement-changed': {
    title: 'The rules have changed',
    means: 'Since you opened the page, the text you agree to was reissued.',
    steps: ['Load the paper’s page again and read the new text before you begin.'],
  },
  'paper-not-ready': {
    title: 'This paper cannot be sat just now',
    means: 'The school has to put something right first. It is not your doing.',
    steps: ['Tell the school what the message said.'],
    link: toMap,
  },
  'already-certified': {
    title: 'You hold this certificate already',
    means: 'A paper you have passed is sat again only when its certificate is due for renewal.',
    steps: ['Your certificate is in your record.'],
    link: toRecord,
  },
  'result-not-ready': {
    title: 'The paper is not marked yet',
    means: 'Marking begins when it is handed in and takes a few seconds.',
    steps: ['Wait on the result page; it looks again by itself.'],
    link: toRecord,
  },
};
