import Markdown, { type Components } from 'react-markdown';

const inline: Components = { p: ({ children }) => <>{children}</> };

/** One line of Markdown without a paragraph of its own; raw HTML stays text. */
export function InlineMarkdown({ children }: { children: string }) {
  return <Markdown components={inline}>{children}</Markdown>;
}
