import { readCertificateNumber } from '@ferrule/certificates/verify';
import { type RegisterAnswer } from '../../api/views.ts';
import { sayMomentInUtc } from '../../ui/dates.ts';
import { EmptyStrandMark, StrandMark } from '../../ui/strand-mark.tsx';
import { sayVerdict, sizeOfWord } from './verdict-words.ts';

interface RegisterVerdictProps {
  answer: RegisterAnswer;
  /** What the visitor typed, shown back when nothing goes with it. */
  typedNumber?: string | undefined;
}

/** The answer at a glance: the word, the date, the number, the mark. */
export function RegisterVerdict({ answer, typedNumber }: RegisterVerdictProps) {
  const { word, until, todo } = sayVerdict(answer);
  const isMissing = answer.certificate === null;
  return (
    <section className={`verdict ${answer.answer} ${sizeOfWord(word)}`}>
      <div className="verdict-word">
        <NumberLine answer={answer} typedNumber={typedNumber} />
        <h1>{word}</h1>
        {until && <p className="until">{until}</p>}
        <p className="todo">{todo}</p>
        {isMissing && typedNumber && <SlipInNumber typedNumber={typedNumber} />}
        <p className="when">Checked against the register on {sayMomentInUtc(answer.checkedAt)}</p>
      </div>
      <VerdictMark answer={answer} />
    </section>
  );
}

/** What a look at the number alone tells, by its own check character. */
function SlipInNumber({ typedNumber }: { typedNumber: string }) {
  const reading = readCertificateNumber(typedNumber);
  return reading.ok ? null : <p className="todo">{reading.reason}</p>;
}

function NumberLine({ answer, typedNumber }: RegisterVerdictProps) {
  if (answer.certificate) {
    return (
      <p className="kicker">
        Certificate <span className="mono">{answer.certificate.number}</span>
      </p>
    );
  }
  if (!typedNumber) return null;
  return (
    <p className="kicker">
      You entered <span className="mono">{typedNumber}</span>
    </p>
  );
}

const tones = {
  valid: 'verdigris',
  expired: 'grey',
  superseded: 'grey',
  withdrawn: 'reversed',
} as const;

function VerdictMark({ answer }: { answer: RegisterAnswer }) {
  const { certificate } = answer;
  if (!certificate || answer.answer === 'not-on-register') {
    return (
      <div className="verdict-mark">
        <EmptyStrandMark />
      </div>
    );
  }
  return (
    <div className="verdict-mark">
      <StrandMark
        certificateNumber={certificate.number}
        tone={tones[answer.answer]}
        struck={answer.answer === 'withdrawn'}
      />
      <p>Strand mark, drawn from the number. It must match the one on the certificate.</p>
    </div>
  );
}
