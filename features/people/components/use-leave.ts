'use client';

import { usePathname, useRouter } from 'next/navigation';

/** Closing the panel, with and without something new to read. */
export const useLeave = () => {
  const router = useRouter();
  const pathname = usePathname();
  const leave = (): void => router.push(pathname, { scroll: false });
  return {
    leave,
    readAgain: () => router.refresh(),
    saved: () => {
      leave();
      router.refresh();
    },
  };
};
