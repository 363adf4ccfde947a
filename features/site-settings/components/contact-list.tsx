import type { Contact } from '@/lib/domain/site/site';
import { contactWords } from '../words';

const press = 'inline-flex min-h-9 items-center font-semibold underline underline-offset-3 pointer-coarse:min-h-11';

/** Each one press away: a call or a mail. */
export function ContactList({ contacts }: { readonly contacts: readonly Contact[] }) {
  return (
    <ul className="grid gap-2 text-[13.5px]">
      {contacts.map(({ kind, name, phone, email }, index) => (
        <li key={index}>
          <span className="text-soft">{contactWords[kind]}</span> <b className="font-semibold">{name}</b>
          <span className="flex flex-wrap gap-x-4">
            {phone === '' ? null : <a className={press} href={`tel:${phone.replace(/[^\d+]/g, '')}`}>{phone}</a>}
            {email === '' ? null : <a className={`${press} break-all`} href={`mailto:${email}`}>{email}</a>}
          </span>
        </li>
      ))}
    </ul>
  );
}
