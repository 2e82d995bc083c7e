import { type Answer } from '../api/views.ts';

type CourseMapView = Answer<'Courses_course'>;

/** A course of three units: one done and lit, one begun, one not yet issued. */
export function makeCourseMap(more: Partial<CourseMapView> = {}): CourseMapView {
  return {
    number: 'HQ-DC2',
    slug: 'hq-dc2',
    title: 'Auxiliary DC systems: installation',
    revision: 'F',
    issued: '2026-09-14',
    owner: 'Harrow Quay Technical School',
    trainer: 'O. Marchetti',
    class: { id: '7d0f6a52-0c5e-4f3e-9a3b-3f1c9b6a0100', name: 'Autumn 2026' },
    enrolledOn: '2026-09-14',
    intro: '',
    carryOn: { sheet: '3.4', title: 'The long run', paragraph: 4, of: 15, minutesLeft: 11 },
    units: [
      {
        number: 1,
        title: 'Circuits and safe isolation',
        issued: true,
        sheets: [
          {
            number: '1.4',
            slug: 'isolate-lock-prove-dead',
            title: 'Isolate, lock, prove dead',
            state: 'done',
            revised: { from: 'A', to: 'B' },
            paragraph: 12,
            doneOn: '2026-10-02',
          },
        ],
        worksheet: {
          number: 'W1',
          title: 'Isolate and wait',
          questions: 1,
          passPercent: 80,
          best: { marks: 6, outOf: 6, percent: 100, on: '2026-10-09' },
          lit: true,
          attempts: 1,
          openAttemptId: null,
        },
      },
      {
        number: 2,
        title: 'Conductors and terminations',
        issued: false,
        sheets: [],
        worksheet: null,
      },
      {
        number: 3,
        title: 'Voltage drop',
        issued: true,
        sheets: [
          {
            number: '3.4',
            slug: 'the-long-run',
            title: 'The long run',
            state: 'begun',
            revised: null,
            paragraph: 4,
            doneOn: null,
          },
        ],
        worksheet: {
          number: 'W3',
          title: 'Runs and returns',
          questions: 3,
          passPercent: 80,
          best: { marks: 4, outOf: 7, percent: 57, on: '2026-11-30' },
          lit: false,
          attempts: 1,
          openAttemptId: null,
        },
      },
    ],
    paper: {
      slug: 'final-paper',
      number: 'F1',
      title: 'Final paper',
      state: 'open',
      mayStartAt: null,
      sittingId: null,
      certificateId: null,
    },
    ...more,
  };
}
