import '../features/register/register.css';
import { useEffect, useRef } from 'react';
import { useLocation } from 'react-router-dom';
import { type TypedCheck } from '../features/register/number-form.tsx';
import {
  DeskAnswer,
  DeskWays,
  type RegisterDesk,
  useRegisterDesk,
} from '../features/register/register-desk.tsx';
import { focusOnHeading } from '../ui/focus-on-heading.ts';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';

export function Component() {
  const desk = useRegisterDesk();
  useCarriedCheck(desk);
  useFocusOnAnswer(desk);
  return (
    <Sheet width="narrow" busy={desk.typed.isPending || desk.looked.isPending}>
      <PageTitle>Check a certificate</PageTitle>
      <DeskAnswer desk={desk}>
        <SheetHead
          kicker="Register"
          title="Check a certificate"
          standfirst="By its number and the holder’s family name, or with the PDF itself. The answer is the register’s, at this moment."
        />
      </DeskAnswer>
      <DeskWays desk={desk} />
    </Sheet>
  );
}

/** What was typed on the front page is checked on arrival. */
function useCarriedCheck(desk: RegisterDesk) {
  const location = useLocation();
  const check = desk.typed.mutate;
  const isChecked = useRef(false);
  useEffect(() => {
    const carried: unknown = location.state;
    if (isChecked.current || !isTypedCheck(carried)) return;
    isChecked.current = true;
    check(carried);
  }, [location.state, check]);
}

function isTypedCheck(state: unknown): state is TypedCheck {
  return typeof state === 'object' && state !== null && 'number' in state && 'familyName' in state;
}

/** The answer stands where the heading stood; a screen reader and the keyboard go to it. */
function useFocusOnAnswer({ typed, looked, asked }: RegisterDesk) {
  const answered = typed.data ?? asked.data ?? looked.data;
  useEffect(() => {
    if (!answered) return;
    focusOnHeading();
  }, [answered]);
}
