'use client';

import type { ComponentType } from 'react';
import type { Part } from '../schema';
import type { PartView } from '../view';
import { AboutForm } from './parts/about-form';
import { ContactsForm } from './parts/contacts-form';
import { CoursesForm } from './parts/courses-form';
import { FollowForm } from './parts/follow-form';
import { LinkForm } from './parts/link-form';
import { NamesForm } from './parts/names-form';
import { NetworkForm } from './parts/network-form';
import { SharedPointsForm } from './parts/shared-points-form';

const forms: { readonly [Of in Part]: ComponentType<{ readonly view: PartView<Of> }> } = {
  about: AboutForm, network: NetworkForm, link: LinkForm, 'shared-points': SharedPointsForm, names: NamesForm, courses: CoursesForm, follow: FollowForm, contacts: ContactsForm,
};

/** The form of whichever part is open. */
export function SettingsPanel<Of extends Part>({ view }: { readonly view: PartView<Of> }) {
  const Form: ComponentType<{ readonly view: PartView<Of> }> = forms[view.part];
  return <Form view={view} />;
}
