import { type QueryClient } from '@tanstack/react-query';
import { answerOf, api } from '../../api/client.ts';
import { type FileAnswer, type RegisterAnswer } from '../../api/views.ts';
import { issuersQuery } from './queries.ts';

/** What is to be said of a file; `register` when the file's certificate is known. */
export interface FileReport {
  /** 'the-very-file', or what is wrong with it. */
  finding: string;
  detail: string;
  number: string | null;
  register: RegisterAnswer | null;
}

const sizeLimitBytes = 5 * 1024 * 1024;

/**
 * Looks at a dropped file without sending it anywhere: the register is asked about its hash,
 * and the signature is checked here.
 */
export async function lookAtFile(file: File, queryClient: QueryClient): Promise<FileReport> {
  if (file.size > sizeLimitBytes) {
    return report('too-large', 'A certificate of ours is well under 5 MB.');
  }
  const bytes = new Uint8Array(await file.arrayBuffer());
  const { numberInPdf, sha256Hex, verifyPdf } = await import('@ferrule/certificates/verify');
  const sha256 = await sha256Hex(bytes);
  const [register, { issuers }] = await Promise.all([
    answerOf(api.GET('/api/register/files/{sha256}', { params: { path: { sha256 } } })),
    queryClient.ensureQueryData(issuersQuery),
  ]);
  // The time of issue is the register's own record, never what the file says.
  const issuedAt = new Date(register.signedAt ?? register.checkedAt);
  const found = await verifyPdf(bytes, { issuers, issuedAt });
  if (!found.ok) {
    return { ...report(found.fault, found.detail), number: found.number ?? numberInPdf(bytes) };
  }
  if (register.answer === 'not-on-register') {
    return {
      ...report('not-on-register', 'It is signed with our key, but the register does not know it.'),
      number: found.number,
    };
  }
  return { ...report('the-very-file', ''), number: found.number, register };
}

function report(finding: string, detail: string): FileReport {
  return { finding, detail, number: null, register: null };
}

/** Only when the visitor asks: the file goes to the server, which looks for itself. */
export async function askTheServer(file: File): Promise<FileReport> {
  const form = new FormData();
  form.append('file', file);
  const answer: FileAnswer = await answerOf(
    api.POST('/api/register/files', { body: { file: '' }, bodySerializer: () => form }),
  );
  const isOurs = answer.file === 'the-very-file';
  return {
    ...report(answer.file, answer.detail),
    number: answer.number,
    register: isOurs ? answer.register : null,
  };
}
