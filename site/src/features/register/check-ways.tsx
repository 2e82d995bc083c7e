import { FileDrop } from './file-drop.tsx';
import { NumberForm, type TypedCheck } from './number-form.tsx';

interface CheckWaysProps {
  busy: 'typed' | 'file' | null;
  problem: unknown;
  onCheck: (typed: TypedCheck) => void;
  onFile: (file: File) => void;
}

/** The ways in: by number and name, or by the file. The third way is the code on the paper. */
export function CheckWays({ busy, problem, onCheck, onFile }: CheckWaysProps) {
  return (
    <div className="check-ways not-printed">
      <NumberForm busy={busy === 'typed'} problem={problem} onCheck={onCheck} />
      <FileDrop busy={busy === 'file'} onFile={onFile} />
      <p className="fine">
        Or point a camera at the code on the certificate. A check shows what is printed on the
        certificate and nothing else. An unknown number and a wrong name get the same answer.
      </p>
    </div>
  );
}
