import { useMemo, type ReactElement } from 'react';
import ReactMarkdown, { type Components } from 'react-markdown';
import rehypeSanitize from 'rehype-sanitize';
import remarkGfm from 'remark-gfm';
import { Link } from './link';
import { placeParts, type Linkify, type MarkNode } from './markdown-parts';

export interface MarkdownBodyProps {
  text: string;
  linkify?: Linkify<ReactElement>;
}

/** Headings of a message are strong lines: the page's outline belongs to the page. */
const line = ({ children }: { children?: React.ReactNode }) => (
  <p>
    <strong>{children}</strong>
  </p>
);

const plainComponents: Components = {
  h1: line,
  h2: line,
  h3: line,
  h4: line,
  h5: line,
  h6: line,
  a: ({ href, children }) => (href ? <Link href={href}>{children}</Link> : <>{children}</>),
  // A picture from elsewhere would tell its server who reads: it is offered as a link.
  img: ({ src, alt }) => (typeof src === 'string' && src ? <Link href={src}>{alt || 'picture'}</Link> : null),
};

export default function MarkdownBody({ text, linkify }: MarkdownBodyProps) {
  const { plugins, components } = useMemo(() => {
    let drawn: ReactElement[] = [];
    const findParts = () => (tree: MarkNode) => {
      if (linkify) drawn = placeParts(tree, linkify);
    };
    const span: Components['span'] = ({ node, children }) => {
      const part = node?.properties.dataPart;
      return typeof part === 'number' ? drawn[part] : <span>{children}</span>;
    };
    // Cleaned first: what is put in afterwards comes from the product, not from the writer.
    return { plugins: [rehypeSanitize, findParts], components: { ...plainComponents, span } };
  }, [linkify]);
  return (
    <ReactMarkdown remarkPlugins={[remarkGfm]} rehypePlugins={plugins} components={components}>
      {text}
    </ReactMarkdown>
  );
}
