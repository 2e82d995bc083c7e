import { OpenRingSign, StruckSign, TickSign } from './symbols/signs.tsx';

interface ValidityStateProps {
  state: 'valid' | 'expired' | 'withdrawn' | 'superseded';
}

/** A sign and a word: does it stand? */
export function ValidityState({ state }: ValidityStateProps) {
  switch (state) {
    case 'valid':
      return (
        <>
          <TickSign className="passed" />
          Valid
        </>
      );
    case 'expired':
      return (
        <>
          <OpenRingSign />
          Expired
        </>
      );
    case 'withdrawn':
      return (
        <>
          <StruckSign />
          Withdrawn
        </>
      );
    case 'superseded':
      return (
        <>
          <OpenRingSign />
          Replaced
        </>
      );
  }
}
