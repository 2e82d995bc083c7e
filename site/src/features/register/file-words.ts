interface FileWords {
  word: string;
  says: string;
}

const words: Record<string, FileWords> = {
  'not-a-pdf': { word: 'Not a PDF', says: 'This file is no PDF, so it is no certificate of ours.' },
  'not-signed': {
    word: 'Not signed',
    says: 'Every certificate of ours carries a signature. This file has none: it may be a scan or a print to file.',
  },
  'changed-after-signing': {
    word: 'Changed',
    says: 'This file was altered after it was signed. Do not accept it.',
  },
  'added-to': {
    word: 'Added to',
    says: 'Something was added to this file after it was signed. Do not accept it.',
  },
  'wrong-issuer': {
    word: 'Not ours',
    says: 'This file is signed, but not by this school’s authority. Do not accept it as ours.',
  },
  'unknown-key': {
    word: 'Not ours',
    says: 'This file is signed with a key that is not on the register. Do not accept it as ours.',
  },
  'malformed-signature': {
    word: 'Not readable',
    says: 'The signature in this file cannot be read. Ask the holder for the file as it was mailed.',
  },
  'expired-key-at-issue': {
    word: 'Not ours',
    says: 'The key was out of use when this file says it was issued. Do not accept it.',
  },
  'too-large': { word: 'Too large', says: 'This file is larger than any certificate of ours.' },
  'not-on-register': {
    word: 'Not on the register',
    says: 'Do not accept this file, and tell the school about it.',
  },
};

const unknown: FileWords = {
  word: 'Not ours',
  says: 'This is not a file that the school issued. Do not accept it.',
};

/** A file's finding in a word, and what it means for whoever holds it. */
export function sayFinding(finding: string): FileWords {
  return (Object.hasOwn(words, finding) && words[finding]) || unknown;
}
