import { type HTMLAttributes, type ReactNode, type Ref, Suspense, useState } from 'react';
import { isTakingOver } from './hydration';

interface LeftAsDrawnProps extends HTMLAttributes<HTMLDivElement> {
  readonly children: ReactNode;
  readonly ref?: Ref<HTMLDivElement>;
}

/**
 * Draws its children on the server and on pages reached in the browser; on the page that was sent, it leaves
 * what the server drew. Give it a key that names what is drawn: it does not follow changed children.
 */
export function LeftAsDrawn({ children, ...rest }: LeftAsDrawnProps) {
  const [left] = useState(isTakingOver);
  if (left) return <div {...rest} suppressHydrationWarning dangerouslySetInnerHTML={{ __html: '' }} />;
  return (
    <div {...rest}>
      <Suspense fallback={null}>{children}</Suspense>
    </div>
  );
}
