/** Certificates and register, typed by hand until the server's document names them. */
interface Json<Body> {
  content: { 'application/json': Body };
}
interface Op<Status extends number, Answer, Input = never, Path = never, Query = never> {
  parameters: {
    path: Path;
    query?: Query;
    header?: never;
    cookie?: never;
  };
  requestBody: Json<Input>;
  responses: Record<Status, Json<Answer>>;
}
interface Id {
  id: string;
}

export interface CertificateView {
  id: string;
  number: string;
  holderName: string;
  scheme: { title: string; revision: string };
  scope: string[];
  limits: string[];
  howSat: string;
  issuedOn: string;
  expiresOn: string;
  state: 'valid' | 'expired' | 'withdrawn' | 'superseded';
  ready: boolean;
  registerUrl: string;
  replacedBy: string | null;
  withdrawn: { on: string; reason: string } | null;
  history: { at: string; what: string; by: string }[];
}

export interface RegisterAnswer {
  answer: 'valid' | 'expired' | 'withdrawn' | 'superseded' | 'not-on-register';
  checkedAt: string;
  certificate: null | {
    number: string;
    holderName: string | null;
    scheme: { title: string; revision: string };
    scope: string[];
    limits: string[];
    howSat: string;
    issuedOn: string;
    expiresOn: string;
    withdrawnOn: string | null;
  };
}

export interface FileAnswer {
  file: string;
  detail: string;
  register: RegisterAnswer;
}

interface Issuer {
  keyId: string;
  kind: 'root' | 'leaf';
  pem: string;
  validFrom: string;
  validTo: string;
}

interface Withdrawal {
  reason: string;
}

interface NameCorrection {
  givenName: string;
  familyName: string;
  reason: string;
}

export interface PendingRoutes {
  '/api/certificates': {
    get: Omit<
      Op<200, { certificates: CertificateView[]; nextCursor: string | null }>,
      'requestBody' | 'parameters'
    > & { parameters: { query?: { find?: string; cursor?: string } } };
  };
  '/api/certificates/{id}/withdrawal': { post: Op<200, CertificateView, Withdrawal, Id> };
  '/api/certificates/{id}/name-correction': {
    post: Op<201, CertificateView, NameCorrection, Id>;
  };
  '/api/register/checks': {
    post: Omit<Op<200, RegisterAnswer, { number: string; familyName: string }>, 'parameters'> & {
      parameters: { query?: never };
    };
  };
  '/api/register/links/{code}': {
    get: Omit<Op<200, RegisterAnswer, never, { code: string }>, 'requestBody'>;
  };
  '/api/register/files/{sha256}': {
    get: Omit<Op<200, RegisterAnswer, never, { sha256: string }>, 'requestBody'>;
  };
  '/api/register/issuers': {
    get: Omit<Op<200, { issuers: Issuer[] }>, 'requestBody' | 'parameters'> & {
      parameters: { query?: never };
    };
  };
  '/api/register/files': {
    post: Omit<Op<200, FileAnswer, { file: string }>, 'parameters'> & {
      parameters: { query?: never };
    };
  };
}
