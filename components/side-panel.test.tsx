// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, beforeAll, describe, expect, it, vi } from 'vitest';
import { SidePanel } from './side-panel';

/** jsdom knows the element and not its opening. */
beforeAll(() => {
  HTMLDialogElement.prototype.showModal = function showModal() {
    this.open = true;
  };
  HTMLDialogElement.prototype.close = function close() {
    this.open = false;
  };
});
afterEach(cleanup);

const open = (mayClose?: () => boolean) => {
  const close = vi.fn();
  const drawn = render(<SidePanel title="GRILL1" close={close} {...(mayClose === undefined ? {} : { mayClose })}><input aria-label="Name" /></SidePanel>);
  return { close, ...drawn };
};
const panel = (): HTMLDialogElement => screen.getByRole('dialog', { name: 'GRILL1' });

describe('the panel at the side', () => {
  it('closes by Escape, by its button and by a press beside it', () => {
    const { close } = open();
    fireEvent.keyDown(panel(), { key: 'Escape' });
    fireEvent.click(screen.getByRole('button', { name: 'Close' }));
    fireEvent.mouseDown(panel());
    expect(close).toHaveBeenCalledTimes(3);
  });

  it('stays when what was typed is not saved', () => {
    const { close } = open(() => false);
    fireEvent.keyDown(panel(), { key: 'Escape' });
    fireEvent.click(screen.getByRole('button', { name: 'Close' }));
    expect(close).not.toHaveBeenCalled();
    expect(panel().open).toBe(true);
  });

  it('is open again after a browser closed it unasked, with what was typed', () => {
    open(() => false);
    fireEvent.change(screen.getByLabelText('Name'), { target: { value: 'GRILL2' } });
    const sheet = panel();
    sheet.close();
    fireEvent(sheet, new Event('close'));
    expect(sheet.open).toBe(true);
    expect(screen.getByLabelText<HTMLInputElement>('Name').value).toBe('GRILL2');
  });

  it('leaves Escape to a list inside it that is open', () => {
    const { close } = open();
    const escape = new KeyboardEvent('keydown', { key: 'Escape', bubbles: true, cancelable: true });
    escape.preventDefault();
    fireEvent(screen.getByLabelText('Name'), escape);
    expect(close).not.toHaveBeenCalled();
  });

  it('gives the focus back to where it came from', () => {
    const button = document.body.appendChild(document.createElement('button'));
    button.focus();
    const { unmount } = open();
    screen.getByLabelText('Name').focus();
    unmount();
    expect(document.activeElement).toBe(button);
    button.remove();
  });
});
