import 'server-only';
import { cookies } from 'next/headers';

export type ChosenLight = 'system' | 'light' | 'low';

/** The light a person chose on this device, else the system's own. */
export const chosenLight = async (): Promise<ChosenLight> => {
  const value = (await cookies()).get('light')?.value;
  return value === 'light' || value === 'low' ? value : 'system';
};
