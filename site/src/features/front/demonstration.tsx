import { type FrontView } from '../../api/views.ts';

/** Who may be tried out, and that none of it is real. */
export function Demonstration({ people, joinCode }: Pick<FrontView, 'people' | 'joinCode'>) {
  return (
    <section className="demonstration" aria-labelledby="demonstration-title">
      <h2 id="demonstration-title">This is a demonstration</h2>
      <p>
        The school, the employers and the people are invented. Nobody is qualified for work by
        anything passed here, and its certificates vouch for nothing.
      </p>
      {people.length > 0 && (
        <table>
          <caption className="visually-hidden">People to sign in as</caption>
          <thead>
            <tr>
              <th>Sign in as</th>
              <th>Email</th>
              <th>Who is</th>
            </tr>
          </thead>
          <tbody>
            {people.map((person) => (
              <tr key={person.email}>
                <td>{person.name}</td>
                <td>{person.email}</td>
                <td>{person.role}</td>
              </tr>
            ))}
          </tbody>
        </table>
      )}
      {joinCode && (
        <p>
          Or sign up as somebody new and join the class with the code{' '}
          <b className="mono">{joinCode}</b>.
        </p>
      )}
      <p className="fine">
        Their passphrases are made anew for each installation and shown where it was started.
      </p>
    </section>
  );
}
