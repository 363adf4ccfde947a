import { ButtonLink } from '@/components/button-link';
import { MessagePage } from '@/components/message-page';

export default function NotFound() {
  return (
    <MessagePage title="There is nothing at this address" words="It may have been renamed or deleted, or it belongs to a site that is not yours. Nothing on the tills changes: tickets print as before.">
      <ButtonLink kind="primary" href="/sites">Go to my sites</ButtonLink>
    </MessagePage>
  );
}
