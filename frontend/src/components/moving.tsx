import { LazyMotion, MotionConfig, domAnimation } from 'framer-motion';
import type { ReactNode } from 'react';

/**
 * Around whatever moves. It is part of the chunks that need it and not of the application, whose first script would
 * otherwise carry it for pages on which nothing moves.
 */
export function Moving({ children }: { children: ReactNode }) {
  return (
    <LazyMotion features={domAnimation} strict>
      <MotionConfig reducedMotion="user">{children}</MotionConfig>
    </LazyMotion>
  );
}
