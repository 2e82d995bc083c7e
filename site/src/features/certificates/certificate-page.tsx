import { type CertificateView } from '../../api/views.ts';
import { sayDateInFull } from '../../ui/dates.ts';
import { StrandMark } from '../../ui/strand-mark.tsx';
import { FerruleShape } from '../../ui/symbols/ferrule.tsx';
import { CertificateRing } from './certificate-ring.tsx';

interface CertificatePageProps {
  certificate: CertificateView;
  school: { name: string; address: string };
}

const longName = 18;
/** Twice as long as a name that is set at full size: two lines. */
const sizeOfName = (name: string) => (name.length > longName ? 'long-name' : undefined);

/** The certificate as its sheet is laid out, scaled to the room there is. Paper stays white in the dark. */
export function CertificatePage({ certificate, school }: CertificatePageProps) {
  const isWithdrawn = certificate.state === 'withdrawn';
  return (
    <article className="certificate-page" aria-label={`Certificate ${certificate.number}`}>
      <div className="certificate-sheet">
        <div className="certificate-frame">
          <header>
            <Mark />
            <span>{school.name}</span>
          </header>
          <div className="certificate-holder">
            <p>This certifies that</p>
            <h2 className={sizeOfName(certificate.holderName)}>{certificate.holderName}</h2>
            <p>has passed the certification paper and is certified as</p>
            <h3>{certificate.scheme.title}</h3>
            <ul className="certificate-scope">
              {certificate.scope.map((line) => (
                <li key={line}>{line}</li>
              ))}
            </ul>
          </div>
          <div className="certificate-seal">
            <CertificateRing />
            <StrandMark certificateNumber={certificate.number} struck={isWithdrawn} />
          </div>
          <Blocks certificate={certificate} />
          <Foot certificate={certificate} school={school} />
        </div>
      </div>
    </article>
  );
}

function Mark() {
  return (
    <b className="certificate-mark">
      <svg viewBox="0 0 44 20" aria-hidden="true">
        <FerruleShape />
      </svg>
      Ferrule
    </b>
  );
}

function Blocks({ certificate }: { certificate: CertificateView }) {
  return (
    <div className="certificate-blocks">
      <section>
        <h4>Not covered</h4>
        {certificate.limits.map((line) => (
          <p key={line}>{line}</p>
        ))}
      </section>
      <section>
        <h4>How it was sat</h4>
        <p>{certificate.howSat}</p>
      </section>
    </div>
  );
}

function Foot({ certificate, school }: CertificatePageProps) {
  return (
    <footer>
      <p>
        Check this certificate at
        <br />
        <b>{new URL(certificate.registerUrl, location.href).host}/check</b>
        <br />
        or with the code on the PDF.
        <br />
        The register and the signature in the file are the proof; the strand mark only helps the
        eye.
      </p>
      <dl>
        <Cell label="Certificate no." value={certificate.number} className="mono wide" />
        <Cell label="Sheet" value="1 of 1" />
        <Cell label="Issued" value={sayDateInFull(certificate.issuedOn)} className="half" />
        <Cell label="Expires" value={sayDateInFull(certificate.expiresOn)} className="half" />
        <Cell label="Scheme" value={certificate.scheme.title} className="wide" />
        <Cell label="Revision" value={certificate.scheme.revision} />
        <Cell
          label="Certifying body"
          value={`${school.name}, ${school.address}`}
          className="whole"
        />
      </dl>
    </footer>
  );
}

interface CellProps {
  label: string;
  value: string;
  className?: string;
}

function Cell({ label, value, className }: CellProps) {
  return (
    <div className={className}>
      <dt>{label}</dt>
      <dd>{value}</dd>
    </div>
  );
}
