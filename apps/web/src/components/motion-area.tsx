import { LazyMotion, MotionConfig } from 'framer-motion';
import type { ReactNode } from 'react';

const features = () => import('./motion-features').then((module) => module.default);

/** Where `m` elements move; what moves them comes when such a place is first shown, and minds reduced motion. */
export function MotionArea({ children }: { children: ReactNode }) {
  return (
    <LazyMotion features={features} strict>
      <MotionConfig reducedMotion="user">{children}</MotionConfig>
    </LazyMotion>
  );
}
