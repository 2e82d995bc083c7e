export function PassphraseHints() {
  return (
    <>
      <h2>A passphrase that holds</h2>
      <ul className="dash-list">
        <li>Fifteen characters or more. Four or five words will do it.</li>
        <li>Spaces count. Capitals, figures and signs are not asked for.</li>
        <li>Paste it from a password manager if you use one.</li>
        <li>Common ones are refused, and you are told so.</li>
      </ul>
    </>
  );
}
