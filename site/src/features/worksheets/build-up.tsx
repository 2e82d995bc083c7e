import { Link } from 'react-router-dom';

interface BuildUpProps {
  questions: readonly { slug: string; title: string; marks: number }[];
}

/** Each question of the worksheet on its own, worked first and left to the trainee step by step. */
export function BuildUp({ questions }: BuildUpProps) {
  return (
    <section className="section" aria-labelledby="build-up-title">
      <h2 id="build-up-title">One at a time</h2>
      <p>
        See a question worked, do its last step, then more of it, then the whole. It counts for
        nothing here.
      </p>
      <ul className="build-up">
        {questions.map(({ slug, title, marks }) => (
          <li key={slug}>
            <span>{title}</span>
            <span className="muted">{marks === 1 ? '1 mark' : `${marks} marks`}</span>
            <Link to={`/practice/${slug}?left=0`}>
              Build up to it<span className="visually-hidden">: {title}</span>
            </Link>
          </li>
        ))}
      </ul>
    </section>
  );
}
