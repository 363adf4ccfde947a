// @vitest-environment jsdom
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { PersonMenu } from './person-menu';

vi.mock('next/navigation', () => ({ usePathname: () => '/sites/lantern-yard/board', useSearchParams: () => new URLSearchParams('plan=lunch') }));
afterEach(cleanup);

const menu = (): HTMLElement => {
  const drawn = render(<PersonMenu person={{ name: 'Ines Okafor', title: 'head chef' }} light="low" manySites={false} />);
  return drawn.container.querySelector<HTMLElement>('[popover]') ?? drawn.container;
};
const formOf = (name: RegExp): HTMLFormElement => {
  const { form } = screen.getByRole<HTMLButtonElement>('button', { name, hidden: true });
  if (form === null) throw new Error(`${name} is in no form`);
  return form;
};

describe("a person's own menu", () => {
  it('opens without a script: the button with the name points at it', () => {
    const { id } = menu();
    expect(screen.getByRole('button', { name: /Ines Okafor, head chef/ }).getAttribute('popovertarget')).toBe(id);
  });

  it('says which light is chosen', () => {
    menu();
    const chosen = screen.getAllByRole('button', { hidden: true, pressed: true }).map((button) => button.textContent);
    expect(chosen).toEqual(['Low light, for dim rooms']);
  });

  it('comes back to the page that the light was chosen on', () => {
    menu();
    const form = formOf(/^Light$/);
    expect([form.method, form.action]).toEqual(['post', expect.stringMatching(/\/api\/account\/light$/)]);
    expect(new FormData(form).get('back')).toBe('/sites/lantern-yard/board?plan=lunch');
  });

  it('signs out by a plain form', () => {
    menu();
    expect(formOf(/Sign out/).action).toMatch(/\/api\/account\/sign-out$/);
  });
});
