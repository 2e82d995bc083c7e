import { type CertificateView } from '../../api/views.ts';
import { sayDate, sayMoment } from '../../ui/dates.ts';
import { ValidityState } from '../../ui/validity-state.tsx';
import { upperFirst } from '../../ui/words.ts';
import { StrandMark } from '../../ui/strand-mark.tsx';
import { CorrectName } from './correct-name.tsx';
import { Withdraw } from './withdraw.tsx';

/** Whoever chose a certificate in the list goes on reading here. */
function takeFocusFromList(heading: HTMLElement | null) {
  if (document.activeElement?.closest('.certificate-table')) heading?.focus();
}

interface CertificatePanelProps {
  certificate: CertificateView;
  /** Withdrawing and correcting are an administrator's; others look. */
  mayAct: boolean;
}

const tones = {
  valid: 'verdigris',
  expired: 'grey',
  superseded: 'grey',
  withdrawn: 'grey',
} as const;

export function CertificatePanel({ certificate, mayAct }: CertificatePanelProps) {
  const isStanding = certificate.state === 'valid' || certificate.state === 'expired';
  return (
    <>
      <header>
        <div>
          <p className="kicker mono">{certificate.number}</p>
          <h2 id="certificate-title" tabIndex={-1} ref={takeFocusFromList}>
            {certificate.holderName}
          </h2>
          <p>
            <ValidityState state={certificate.state} />, {certificate.scheme.title}
          </p>
        </div>
        <StrandMark
          certificateNumber={certificate.number}
          tone={tones[certificate.state]}
          struck={certificate.state === 'withdrawn'}
        />
      </header>
      <section>
        <dl className="fact-rows">
          <Row label="Scheme revision" value={certificate.scheme.revision} />
          <Row label="How it was sat" value={upperFirst(certificate.howSat)} />
          <Row label="Issued" value={sayDate(certificate.issuedOn)} />
          <Row label="Expires" value={sayDate(certificate.expiresOn)} />
          {certificate.withdrawn && (
            <Row label="Withdrawn" value={sayDate(certificate.withdrawn.on)} />
          )}
          {certificate.replacedBy && <Row label="Replaced by" value={certificate.replacedBy} />}
        </dl>
        {certificate.withdrawn && <p className="fine">Reason: {certificate.withdrawn.reason}</p>}
        <p className="panel-links">
          {certificate.ready ? (
            <a href={`/api/certificates/${certificate.id}/file`} download>
              Download the PDF
            </a>
          ) : (
            'The PDF is being drawn.'
          )}
          <a href={certificate.registerUrl}>Its register page</a>
        </p>
      </section>
      {mayAct && isStanding && (
        <CorrectName key={`name-${certificate.id}`} certificate={certificate} />
      )}
      {mayAct && isStanding && <Withdraw key={certificate.id} certificate={certificate} />}
      <History history={certificate.history} />
    </>
  );
}

function Row({ label, value }: { label: string; value: string }) {
  return (
    <div>
      <dt>{label}</dt>
      <dd>{value}</dd>
    </div>
  );
}

function History({ history }: { history: CertificateView['history'] }) {
  if (history.length === 0) return null;
  return (
    <section>
      <h3>History</h3>
      <ul className="panel-history">
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
