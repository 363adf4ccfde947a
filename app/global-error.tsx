'use client';

import './globals.css';
import { Button } from '@/components/button';
import { Message } from '@/components/message';

export default function GlobalError({ reset }: { readonly error: Error; readonly reset: () => void }) {
  return (
    <html lang="en">
      <body>
        <title>Tamis could not be shown</title>
        <main><Message title="Tamis could not be shown" words="Something broke that should not have. Nothing was changed, and nothing on the tills changes: tickets print as before. Try again in a moment.">
          <Button kind="primary" onClick={reset}>Try again</Button>
        </Message></main>
      </body>
    </html>
  );
}
