import { ButtonLink } from '@/components/button-link';
import { Message } from '@/components/message';

export default function NotFound() {
  return (
    <Message title="There is nothing at this address" words="It may have been renamed or deleted, or it belongs to a site that is not yours. Nothing on the tills changes: tickets print as before.">
      <ButtonLink kind="primary" href="/sites">Go to my sites</ButtonLink>
    </Message>
  );
}
