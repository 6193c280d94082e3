import { Link } from '../../../ui';

/** Links in our own messages lead to this same server; the page is then not loaded anew. */
export function LocalLink({ address }: { address: string }) {
  const isOurs = address.startsWith(window.location.origin);
  return <Link href={isOurs ? address.slice(window.location.origin.length) : address}>{address}</Link>;
}
