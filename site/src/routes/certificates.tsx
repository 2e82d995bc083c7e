import '../features/certificates/certificates.css';
import { useInfiniteQuery, useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { type LoaderArgs, requireSession, sessionQuery } from '../api/session.ts';
import { CertificatePanel } from '../features/certificates/certificate-panel.tsx';
import { CertificateTable } from '../features/certificates/certificate-table.tsx';
import { certificatesQuery } from '../features/certificates/queries.ts';
import { FindField } from '../ui/find-field.tsx';
import { type CertificateView } from '../api/views.ts';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { EmptyState, FailedState, RuledLines } from '../ui/states.tsx';
import { TableFoot } from '../ui/table-foot.tsx';

export async function loader(args: LoaderArgs) {
  await requireSession(args, 'administrator', 'certification-manager');
  return null;
}

export function Component() {
  const [params, setParams] = useSearchParams();
  const find = params.get('find') ?? '';
  return (
    <Sheet width="wide" flat>
      <PageTitle>Certificates</PageTitle>
      <SheetHead
        title="Certificates"
        standfirst="Everything issued, with what the public check says of it now."
      />
      <div className="desk-bar">
        <FindField
          label="Find a name or number"
          value={find}
          onFind={(typed) => setParams(typed ? { find: typed } : {}, { replace: true })}
        />
      </div>
      <Desk find={find} selectedId={params.get('certificate')} />
    </Sheet>
  );
}

interface DeskProps {
  find: string;
  selectedId: string | null;
}

function Desk({ find, selectedId }: DeskProps) {
  const list = useInfiniteQuery(certificatesQuery(find));
  if (list.isPending) return <RuledLines what="the certificates" />;
  if (list.isError) return <FailedState error={list.error} retry={() => void list.refetch()} />;
  const certificates = list.data.pages.flatMap((page) => page.certificates);
  if (certificates.length === 0) return <NoCertificates find={find} />;
  const selected = certificates.find((certificate) => certificate.id === selectedId);
  const linkTo = (id: string) =>
    `?${new URLSearchParams({ ...(find && { find }), certificate: id })}`;
  return (
    <div className={selected ? 'certificate-desk with-panel' : 'certificate-desk'}>
      <div className="table-scroll">
        <CertificateTable certificates={certificates} selectedId={selectedId} linkTo={linkTo} />
        <TableFoot shown={certificates.length} list={list} />
      </div>
      {selected && <Panel key={selected.id} certificate={selected} />}
    </div>
  );
}

function NoCertificates({ find }: { find: string }) {
  return (
    <EmptyState title={find ? 'No certificate matches' : 'No certificate has been issued yet'}>
      {find
        ? 'Try a part of the holder’s name, or the number as it is printed.'
        : 'The first appears here when a candidate passes a paper.'}
    </EmptyState>
  );
}

function Panel({ certificate }: { certificate: CertificateView }) {
  const { data: session } = useQuery(sessionQuery);
  return (
    <aside className="certificate-panel" aria-labelledby="certificate-title">
      <CertificatePanel
        certificate={certificate}
        mayAct={session?.account.roles.includes('administrator') ?? false}
      />
    </aside>
  );
}
