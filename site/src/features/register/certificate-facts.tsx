import { type RegisterAnswer } from '../../api/views.ts';
import { sayDate } from '../../ui/dates.ts';
import { upperFirst } from '../../ui/words.ts';
import { Facts } from '../../ui/title-block.tsx';

type Certificate = NonNullable<RegisterAnswer['certificate']>;

type FactCell = Parameters<typeof Facts>[0]['cells'][number];

function listFacts(certificate: Certificate): FactCell[] {
  const { holderName } = certificate;
  const holder: FactCell[] = holderName
    ? [{ label: 'Holder', value: holderName, span: 3, kind: 'strong' }]
    : [];
  return [
    ...holder,
    {
      label: 'Qualification',
      value: certificate.scheme.title,
      span: holderName ? 3 : 6,
      kind: 'strong',
    },
    { label: 'How it was sat', value: upperFirst(certificate.howSat), span: 3 },
    { label: 'Issued', value: sayDate(certificate.issuedOn), span: 1 },
    { label: 'Expires', value: sayDate(certificate.expiresOn), span: 1 },
    { label: 'Revision', value: certificate.scheme.revision, span: 1 },
  ];
}

interface CertificateFactsProps {
  certificate: Certificate;
  /** A withdrawn certificate vouches for nothing: what it covered is left out. */
  withScope: boolean;
}

/** What is printed on the certificate, and nothing else. */
export function CertificateFacts({ certificate, withScope }: CertificateFactsProps) {
  return (
    <>
      <Facts cells={listFacts(certificate)} />
      {withScope && <Scope certificate={certificate} />}
    </>
  );
}

function Scope({ certificate }: { certificate: Certificate }) {
  return (
    <div className="certificate-scope">
      <section>
        <h2>Assessed</h2>
        <List items={certificate.scope} className="passed-list" />
      </section>
      <section>
        <h2>Not covered</h2>
        <List items={certificate.limits} className="not-covered" />
      </section>
      <section>
        <h2>Hold the paper up to this page</h2>
        <p>
          The name, the number and the strand mark should all agree. If one does not, the paper is
          not ours: tell the school. The mark is an aid to the eye; the proof is this register and
          the signature in the file.
        </p>
      </section>
    </div>
  );
}

function List({ items, className }: { items: string[]; className: string }) {
  return (
    <ul className={`dash-list ${className}`}>
      {items.map((item) => (
        <li key={item}>{item}</li>
      ))}
    </ul>
  );
}
