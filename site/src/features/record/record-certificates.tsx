import { Link } from 'react-router-dom';
import { type CertificateView } from '../../api/views.ts';
import { sayDate } from '../../ui/dates.ts';
import { StrandMark } from '../../ui/strand-mark.tsx';
import { ValidityState } from '../../ui/validity-state.tsx';

const tones = {
  valid: 'verdigris',
  expired: 'grey',
  superseded: 'grey',
  withdrawn: 'grey',
} as const;

/** One's own certificates, each with its mark, its state and its file. */
export function RecordCertificates({ certificates }: { certificates: CertificateView[] }) {
  if (certificates.length === 0) {
    return (
      <p>
        None yet. A certificate is issued when you pass the paper, and it stands here and in the
        public register.
      </p>
    );
  }
  return (
    <ul className="record-certificates">
      {certificates.map((certificate) => (
        <li key={certificate.id}>
          <StrandMark
            certificateNumber={certificate.number}
            tone={tones[certificate.state]}
            struck={certificate.state === 'withdrawn'}
          />
          <div>
            <p>
              <Link to={`/certificates/${certificate.id}`}>
                <b>{certificate.scheme.title}</b>
              </Link>
            </p>
            <p className="mono">{certificate.number}</p>
            <p className="muted">
              <ValidityState state={certificate.state} />, {sayPeriod(certificate)}
            </p>
          </div>
          <p>
            {certificate.ready ? (
              <a href={`/api/certificates/${certificate.id}/file`} download>
                Download<span className="visually-hidden"> certificate {certificate.number}</span>
              </a>
            ) : (
              'Being drawn'
            )}
          </p>
        </li>
      ))}
    </ul>
  );
}

function sayPeriod({ issuedOn, expiresOn }: CertificateView): string {
  return `${sayDate(issuedOn)} to ${sayDate(expiresOn)}`;
}
