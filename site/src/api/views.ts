import { type operations } from './schema.gen.ts';

/** The body a route answers with: `Answer<'Sessions_current'>`. */
export type Answer<Route extends keyof operations> = operations[Route] extends {
  responses: infer Replies;
}
  ? Extract<Replies[keyof Replies], { content: { 'application/json': unknown } }> extends {
      content: { 'application/json': infer Body };
    }
    ? Body
    : never
  : never;

export type SessionView = Answer<'Sessions_current'>;
export type Role = SessionView['account']['roles'][number];
export type OwnSession = Answer<'Sessions_list'>['sessions'][number];
export type PersonView = Answer<'People_get'>['person'];
export type FrontView = Answer<'Courses_front'>;
export type CertificateView = Answer<'Certificates_get'>;
export type RegisterAnswer = Answer<'Register_check'>;
export type FileAnswer = Answer<'Register_checkFile'>;
