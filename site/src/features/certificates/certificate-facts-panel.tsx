import { Button } from '@radix-ui/themes';
import { type CertificateView } from '../../api/views.ts';
import { sayDate, sayDateInFull, sayMoment } from '../../ui/dates.ts';

/** What the register says of the certificate, how to take it along, and what has happened to it. */
export function CertificateFactsPanel({ certificate }: { certificate: CertificateView }) {
  const isValid = certificate.state === 'valid';
  return (
    <aside aria-label="About this certificate">
      <section>
        <p className="kicker">The register says</p>
        <p className={`certificate-state ${certificate.state}`}>{stateWords[certificate.state]}</p>
        <p>
          <StateSaid certificate={certificate} />
        </p>
        <Download certificate={certificate} />
      </section>
      <section>
        <h2>{isValid ? 'Show it to an employer' : 'What an employer sees'}</h2>
        {isValid ? (
          <p>
            Give them the PDF, or the number with your family name. Either is checked at{' '}
            <a href={certificate.registerUrl}>its register page</a>, without an account.
          </p>
        ) : (
          <p>
            The check of the file and of the number says the same as here:{' '}
            <a href={certificate.registerUrl}>its register page</a>.
          </p>
        )}
      </section>
      {certificate.history.length > 0 && <History history={certificate.history} />}
    </aside>
  );
}

const stateWords = {
  valid: 'Valid',
  expired: 'Expired',
  withdrawn: 'Withdrawn',
  superseded: 'Replaced',
} as const;

function StateSaid({ certificate }: { certificate: CertificateView }) {
  const { state, expiresOn, withdrawn, replacedBy } = certificate;
  if (state === 'withdrawn' && withdrawn) {
    return (
      <>
        on {sayDateInFull(withdrawn.on)}. Reason: {withdrawn.reason}
      </>
    );
  }
  if (state === 'superseded' && replacedBy) {
    return (
      <>
        by certificate <b className="mono">{replacedBy}</b>. Use that one.
      </>
    );
  }
  return state === 'expired'
    ? `on ${sayDateInFull(expiresOn)}`
    : `until ${sayDateInFull(expiresOn)}`;
}

function Download({ certificate }: { certificate: CertificateView }) {
  if (!certificate.ready) {
    return (
      <p role="status">
        The PDF is being drawn and signed. This takes a few seconds; the page looks again by itself.
      </p>
    );
  }
  return (
    <>
      <div className="actions">
        <Button size="3" variant={certificate.state === 'valid' ? 'solid' : 'outline'} asChild>
          <a href={`/api/certificates/${certificate.id}/file`} download>
            Download the PDF
          </a>
        </Button>
      </div>
      <p className="fine">
        Signed on {sayDate(certificate.issuedOn)}. Keep the file as it is: printed again or saved
        anew by another program it no longer proves itself.
      </p>
    </>
  );
}

function History({ history }: { history: CertificateView['history'] }) {
  return (
    <section>
      <h2>History</h2>
      <ul className="certificate-history">
        {history.map((entry) => (
          <li key={entry.at + entry.what}>
            <span>{sayMoment(entry.at)}</span>
            <span>
              {entry.what} <small>{entry.by}</small>
            </span>
          </li>
        ))}
      </ul>
    </section>
  );
}
