import { Message, type MessageProps } from './message';
import { Rail } from './rail';
import { TopBar } from './top-bar';

/** A message where there is no site around it: the bar and the rail stay. */
export function MessagePage(message: MessageProps) {
  return (
    <>
      <header><TopBar home={null} /><Rail /></header>
      <main><Message {...message} /></main>
    </>
  );
}
