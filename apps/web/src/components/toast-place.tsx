import { lazy, Suspense, useSyncExternalStore } from 'react';
import { toastsWanted } from './toaster';

const Toasts = lazy(() => import('./toasts'));

/** Where messages come up, from the first one on. */
export function ToastPlace() {
  const wanted = useSyncExternalStore(toastsWanted.subscribe, toastsWanted.read);
  return <Suspense>{wanted && <Toasts />}</Suspense>;
}
