import { Button } from '@radix-ui/themes';
import { useMutation } from '@tanstack/react-query';
import { useState } from 'react';
import Markdown from 'react-markdown';
import { useNavigate } from 'react-router-dom';
import { TickBox } from '../../ui/choice-row.tsx';
import { FormField } from '../../ui/form-field.tsx';
import { Form } from '../../ui/form.tsx';
import { type PaperView, startSitting } from './queries.ts';

interface StartFormProps {
  paper: PaperView;
  givenName: string;
  familyName: string;
}

/** The name for the certificate, the agreement, and the one button that starts the clock. */
export function StartForm({ paper, ...account }: StartFormProps) {
  const navigate = useNavigate();
  const [given, setGiven] = useState(account.givenName);
  const [family, setFamily] = useState(account.familyName);
  const [agreed, setAgreed] = useState(false);
  const starting = useMutation({
    mutationFn: () => startSitting({ paper, givenName: given, familyName: family }),
    onSuccess: ({ id }) => navigate(`/sittings/${id}?q=1`),
  });
  return (
    <Form onSubmit={() => starting.mutate()} problem={starting.error}>
      <h2>Your name on the certificate</h2>
      <FormField
        name="givenName"
        label="Given name"
        required
        missing="Give the name that is to stand on the certificate."
        maxLength={100}
        autoComplete="given-name"
        value={given}
        onValue={setGiven}
      />
      <FormField
        name="familyName"
        label="Family name"
        hint="Leave it empty if you have one name. Employers check the certificate with it."
        maxLength={100}
        autoComplete="family-name"
        value={family}
        onValue={setFamily}
      />
      <p className="printed-name">
        It will be printed as <b>{`${given} ${family}`.trim() || '–'}</b>.
      </p>
      <h2>What you agree to</h2>
      <div className="agreement">
        <Markdown components={lowered}>{paper.agreement}</Markdown>
      </div>
      <TickBox
        label="I have read this and agree to it."
        checked={agreed}
        onChange={setAgreed}
        required
      />
      <div className="actions">
        <Button size="3" type="submit" disabled={!agreed || starting.isPending}>
          Start the paper: {Math.ceil(paper.minutes)} minutes
        </Button>
      </div>
      <p className="fine">
        {!agreed && 'The paper can be started once you have agreed. '}The clock starts at once and
        runs on the school’s server. Each answer is kept as you give it.
      </p>
    </Form>
  );
}

/** Headings of the agreement stand under this page's own. */
const lowered = { h1: 'h3', h2: 'h3', h3: 'h4' } as const;
