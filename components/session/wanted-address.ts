import type { Href } from 'expo-router';

/** Only a path of our own: never another site, whatever the address bar was made to say. */
const isOwnPath = (address: string) => /^\/(?![/\\])[^\s\\]*$/.test(address);

/** The sign-in page, which remembers where the person wanted to go. */
export const signInHref = (pathname: string, selected?: string): Href => {
  if (pathname === '/') return '/sign-in';
  const wanted = selected ? `${pathname}?selected=${encodeURIComponent(selected)}` : pathname;
  return `/sign-in?to=${encodeURIComponent(wanted)}`;
};

/** Where to go after sign-in; the start page where nothing, or nothing of ours, was wanted. */
export const wantedHref = (to: string | undefined): Href => (to && isOwnPath(to) && !to.startsWith('/sign-in') ? (to as Href) : '/');
