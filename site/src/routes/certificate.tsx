import '../features/certificates/certificate-page.css';
import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { cacheOf, type LoaderArgs, requireSession } from '../api/session.ts';
import { CertificateFactsPanel } from '../features/certificates/certificate-facts-panel.tsx';
import { CertificatePage } from '../features/certificates/certificate-page.tsx';
import { certificateQuery } from '../features/certificates/holder-queries.ts';
import { frontQuery } from '../features/front/queries.ts';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { FootStrip } from '../ui/thumb-index.tsx';

export async function loader(args: LoaderArgs) {
  await requireSession(args);
  const cache = cacheOf(args);
  await Promise.all([
    cache.fetchQuery(certificateQuery(args.params.id ?? '')),
    cache.ensureQueryData(frontQuery),
  ]);
  return null;
}

export function Component() {
  const { id = '' } = useParams();
  const { data: certificate } = useQuery(certificateQuery(id));
  const { data: front } = useSuspenseQuery(frontQuery);
  if (!certificate) return null;
  return (
    <>
      <PageTitle>{`Certificate ${certificate.number}`}</PageTitle>
      <Sheet width="wide" flat>
        <SheetHead
          kicker={
            <>
              Certificate <b className="mono">{certificate.number}</b>
            </>
          }
          title={certificate.scheme.title}
        />
        <div className="own-certificate">
          <div>
            <CertificatePage certificate={certificate} school={front.school} />
          </div>
          <CertificateFactsPanel certificate={certificate} />
        </div>
      </Sheet>
      <FootStrip
        label="Certificate"
        links={[
          { label: 'Course map', to: '/course' },
          { label: 'My record', to: '/record' },
        ]}
      />
    </>
  );
}
