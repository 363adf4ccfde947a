'use client';

import type { UseFormRegisterReturn } from 'react-hook-form';
import { TextField } from '@/components/form/text-field';
import { TickField } from '@/components/form/tick-field';
import { roles, type Role } from '@/lib/domain/roles/permissions';
import { roleMeanings, roleWords } from '../words';

type StandingFieldsProps = {
  readonly register: (field: 'role' | 'title' | 'mayOverride') => UseFormRegisterReturn;
  readonly role: Role;
  readonly errors: Partial<Record<'role' | 'title', { readonly message?: string | undefined }>>;
};

/** What somebody is on the site: the role that says what they may, and the site's own word for it. */
export function StandingFields({ register, role, errors }: StandingFieldsProps) {
  return (
    <>
      <fieldset className="grid gap-1.5">
        <legend className="mb-1 text-[12.5px] font-semibold text-soft">Role</legend>
        {roles.map((one) => (
          <label key={one} className="flex items-start gap-2.5 rounded-md border border-line-strong bg-raised px-3 py-2 has-checked:border-ink has-checked:outline-1 has-checked:outline-ink">
            <input type="radio" value={one} className="mt-0.5 size-4 accent-ink" {...register('role')} />
            <span className="text-[14px]"><b className="block font-semibold">{roleWords[one]}</b><span className="text-[12.5px] text-soft">{roleMeanings[one]}</span></span>
          </label>
        ))}
        <p role="alert" className="text-[12.5px] font-semibold text-hot-text empty:hidden">{errors.role?.message}</p>
      </fieldset>
      {role === 'chef' ? (
        <div>
          <TickField label="May override a stop" aria-describedby="override-words" {...register('mayOverride')} />
          <p id="override-words" className="text-[12.5px] text-quiet">Puts a plan live that has something to fix, for one service, by name and with a reason. Never when an allergy would not reach the kitchen.</p>
        </div>
      ) : null}
      <TextField id="title" label="Your word for it" hint="Shown beside the name, for example “sous-chef”." error={errors.title?.message} {...register('title')} />
    </>
  );
}
