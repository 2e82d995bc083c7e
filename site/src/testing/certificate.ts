import { type CertificateView } from '../api/views.ts';

export function makeCertificate(more: Partial<CertificateView> = {}): CertificateView {
  return {
    id: '7d0f6a52-0c5e-4f3e-9a3b-3f1c9b6a0c01',
    number: 'HQ7K-2M4T-9XWD',
    holderName: 'Ifeoma Castellan',
    scheme: { title: 'Auxiliary DC systems installer', revision: 'A' },
    scope: ['Find the voltage drop of a cable run'],
    limits: ['No practical work was assessed'],
    howSat: 'Unsupervised, on the candidate’s own device',
    issuedOn: '2026-12-01',
    expiresOn: '2029-12-01',
    state: 'valid',
    ready: true,
    registerUrl: 'https://harrowquay.example/check/abc',
    replacedBy: null,
    withdrawn: null,
    history: [{ at: '2026-12-01T10:45:21Z', what: 'Issued', by: 'by rule' }],
    ...more,
  };
}
