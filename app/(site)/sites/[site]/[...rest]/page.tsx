import { notFound } from 'next/navigation';

/** Any other address on a site: the message comes with the site's bar and pages around it. */
export default function NoSuchPage() {
  notFound();
}
