import { ButtonLink } from '@/components/button-link';
import { Message } from '@/components/message';

export default function Forbidden() {
  return (
    <Message title="This page is not for your role" words="What you may see and do on a site is for its owner to say. Nothing on the tills changes. Ask the owner if you need it.">
      <ButtonLink kind="primary" href="/sites">Go to my sites</ButtonLink>
    </Message>
  );
}
