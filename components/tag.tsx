import type { ReactNode } from 'react';

export type TagTone = 'calm' | 'look' | 'hot' | 'plain';

const tones: Readonly<Record<TagTone, string>> = {
  calm: 'bg-calm-tint text-calm-text',
  look: 'bg-look-tint text-look-text',
  hot: 'bg-hot text-white',
  plain: 'bg-ground text-soft',
};

/** A state in one or two words. */
export function Tag({ tone = 'plain', children }: { readonly tone?: TagTone; readonly children: ReactNode }) {
  return <span className={`inline-block rounded px-[7px] py-0.5 font-sans text-[11.5px] font-semibold whitespace-nowrap ${tones[tone]}`}>{children}</span>;
}
