import { Link } from 'react-router-dom';
import { type CertificateView } from '../../api/views.ts';
import { sayDate } from '../../ui/dates.ts';
import { ValidityState } from '../../ui/validity-state.tsx';

interface CertificateTableProps {
  certificates: CertificateView[];
  selectedId: string | null;
  linkTo: (id: string) => string;
}

export function CertificateTable({ certificates, selectedId, linkTo }: CertificateTableProps) {
  return (
    <table className="certificate-table">
      <caption className="visually-hidden">Certificates</caption>
      <thead>
        <tr>
          <th>Holder</th>
          <th>Number</th>
          <th>Qualification</th>
          <th className="number">Issued</th>
          <th className="number">Expires</th>
          <th>State</th>
        </tr>
      </thead>
      <tbody>
        {certificates.map((certificate) => (
          <tr
            key={certificate.id}
            className={certificate.id === selectedId ? 'selected' : certificate.state}
          >
            <td className="holder">
              <Link
                to={linkTo(certificate.id)}
                preventScrollReset
                aria-current={certificate.id === selectedId || undefined}
              >
                {certificate.holderName}
              </Link>
            </td>
            <td className="mono">{certificate.number}</td>
            <td className="qualification">{certificate.scheme.title}</td>
            <td className="number issued">{sayDate(certificate.issuedOn)}</td>
            <td className="number expires">{sayDate(certificate.expiresOn)}</td>
            <td className="state">
              <ValidityState state={certificate.state} />
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
