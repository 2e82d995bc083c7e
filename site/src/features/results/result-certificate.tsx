import { Link } from 'react-router-dom';
import { StrandMark } from '../../ui/strand-mark.tsx';
import { type ResultView } from './queries.ts';

/** The certificate of a pass: its number at once, its file when it has been drawn and signed. */
export function ResultCertificate({ result }: { result: ResultView }) {
  const { certificate } = result;
  if (!certificate) {
    return <p>The decision is being recorded. The number appears here within a minute.</p>;
  }
  return (
    <div className="result-certificate">
      <StrandMark certificateNumber={certificate.number} />
      <div>
        <p className="mono">
          <b>{certificate.number}</b>
        </p>
        <p role="status">
          {certificate.ready
            ? 'Drawn and signed. It has gone to you by e-mail as well.'
            : 'Being drawn and signed. This takes a few seconds; the page looks again by itself.'}
        </p>
        {certificate.ready && (
          <p className="certificate-links">
            <a href={`/api/certificates/${certificate.id}/file`} download>
              Download the PDF
            </a>
            <Link to={`/certificates/${certificate.id}`}>Look at it here</Link>
          </p>
        )}
      </div>
    </div>
  );
}
