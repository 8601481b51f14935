import { createContext, useContext } from 'react';

/** The site's own public address, for canonical links and feeds; no slash at the end. */
export const SiteContext = createContext('');
export function usePublicUrl(): string {
  return useContext(SiteContext);
}
