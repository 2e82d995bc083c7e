/** Every problem code with its status and title. Grouped by feature, in alphabetical order. */
export const catalogue: Record<string, { status: number; title: string }> = {
  // common
  'cross-site-request': { status: 403, title: 'Request from another site' },
  'invalid-request': { status: 422, title: 'The request is not in order' },
  'not-allowed': { status: 403, title: 'Not allowed' },
  'not-found': { status: 404, title: 'Not found' },
  'not-signed-in': { status: 401, title: 'Not signed in' },
  'payload-too-large': { status: 413, title: 'Too large' },
  'too-many-attempts': { status: 429, title: 'Too many tries' },
  unavailable: { status: 503, title: 'Not available just now' },
  // classes, lessons, practice, worksheets
  'already-in-class': { status: 409, title: 'In this class already' },
  'answer-unclear': { status: 422, title: 'Some answers cannot be read' },
  'class-not-possible': { status: 409, title: 'No class can be opened yet' },
  'join-code-unknown': { status: 404, title: 'No class has this code' },
  'lesson-revised': { status: 409, title: 'A newer revision is out' },
  'practice-answered': { status: 409, title: 'Marked already' },
  'worksheet-handed-in': { status: 409, title: 'Handed in already' },
  // accounts, sessions, people
  'administrator-exists': { status: 409, title: 'There is an administrator' },
  'fresh-sign-in-needed': { status: 403, title: 'Passphrase needed once more' },
  'last-administrator': { status: 409, title: 'The last administrator' },
  'link-not-valid': { status: 410, title: 'This link no longer works' },
  'no-enrolment': { status: 409, title: 'Nothing to confirm' },
  'not-on-oneself': { status: 409, title: 'Not on your own account' },
  'second-factor-needed': { status: 403, title: 'Second factor needed' },
  'sign-in-refused': { status: 401, title: 'Not signed in' },
  // certificates
  'certificate-ended-meanwhile': { status: 409, title: 'Changed just now by somebody else' },
  'certificate-not-drawn': { status: 409, title: 'The PDF is not ready yet' },
  'certificate-replaced': { status: 409, title: 'Replaced already' },
  'certificate-withdrawn': { status: 409, title: 'Withdrawn already' },
  // papers, sittings
  'agreement-changed': { status: 409, title: 'The rules have changed' },
  'already-certified': { status: 409, title: 'Certified already' },
  'paper-not-ready': { status: 409, title: 'This paper cannot be sat just now' },
  'result-not-ready': { status: 409, title: 'Not marked yet' },
  'sequence-used': { status: 409, title: 'Another answer has this number' },
  'sitting-already-open': { status: 409, title: 'A paper is open already' },
  'sitting-closed': { status: 409, title: 'This paper has been handed in' },
  'taken-over': { status: 409, title: 'Being written on another device' },
  'wait-not-over': { status: 409, title: 'The waiting time is not over' },
};
