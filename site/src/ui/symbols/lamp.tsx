interface LampProps {
  lit: boolean;
  size?: number;
}

/** IEC 60617 lamp, standing alone. Lit is verdigris and keeps its cross. */
export function Lamp({ lit, size = 44 }: LampProps) {
  return (
    <svg
      className={lit ? 'lamp lit' : 'lamp'}
      viewBox="0 0 44 44"
      width={size}
      height={size}
      aria-hidden="true"
    >
      <circle cx="22" cy="22" r="16" />
      <path d="M10.7 10.7 33.3 33.3M33.3 10.7 10.7 33.3" />
    </svg>
  );
}
