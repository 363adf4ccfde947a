'use client';

import { usePathname, useRouter } from 'next/navigation';
import type { FieldValues } from 'react-hook-form';
import { useSavedForm, type SavedForm } from '@/components/form/use-saved-form';
import { savePart } from '../api/save-part';
import { settingDifferences } from '../facts';
import { partSchemas, type Part, type Values } from '../schema';
import type { PartView } from '../view';

export type PartForm<Of extends Part> = { readonly of: SavedForm<Values<Of> & FieldValues>; readonly leave: () => void };

/** The form of one part, saved on its own against the version of the whole site. */
export const usePart = <Of extends Part>({ part, site, version, values }: PartView<Of>): PartForm<Of> => {
  const router = useRouter();
  const pathname = usePathname();
  const leave = (): void => router.push(pathname, { scroll: false });
  const of = useSavedForm<Values<Of> & FieldValues>({
    schema: partSchemas[part] as never,
    stored: { values, version },
    differences: (before, after) => settingDifferences(part, before, after, site),
    save: (typed, at) => savePart(site.id, part, at, typed),
    saved: () => {
      leave();
      router.refresh();
    },
    readAgain: () => router.refresh(),
  });
  return { of, leave };
};
