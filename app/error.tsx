'use client';

import { Button } from '@/components/button';
import { Message } from '@/components/message';

/** Loaded with every page, so it brings nothing that a page has not: going to the sites begins afresh. */
export default function ErrorPage({ reset }: { readonly error: Error; readonly reset: () => void }) {
  return (
    <main><Message title="This page could not be shown" words="Something broke that should not have, or the database cannot be reached. Nothing was changed, and nothing on the tills changes: tickets print as before. Try again in a moment.">
      <Button kind="primary" onClick={reset}>Try again</Button>
      <Button onClick={() => location.assign('/sites')}>Go to my sites</Button>
    </Message></main>
  );
}
