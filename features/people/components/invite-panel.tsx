'use client';

import { FormPanel } from '@/components/form/form-panel';
import { TextField } from '@/components/form/text-field';
import { useSavedForm, type Stored } from '@/components/form/use-saved-form';
import { invite } from '../api/people';
import { invitationInput, type InvitationInput } from '../schema';
import { StandingFields } from './standing-fields';
import { useLeave } from './use-leave';

const nobodyYet: Stored<InvitationInput> = { values: { email: '', role: 'chef', title: '', mayOverride: false }, version: 0 };

/** Asks somebody in, by e-mail. */
export function InvitePanel({ siteId }: { readonly siteId: string }) {
  const { leave, saved, readAgain } = useLeave();
  const of = useSavedForm<InvitationInput>({ schema: invitationInput, stored: nobodyYet, differences: () => [], save: (values) => invite(siteId, values), saved, readAgain });
  return (
    <FormPanel title="Invite somebody" of={of} leave={leave} action="Send the invitation">
      <TextField id="email" label="E-mail" type="email" inputMode="email" hint="They get a link that works once, for seven days." error={of.form.formState.errors.email?.message} {...of.form.register('email')} />
      <StandingFields register={(field) => of.form.register(field)} role={of.typed.role} errors={of.form.formState.errors} />
    </FormPanel>
  );
}
