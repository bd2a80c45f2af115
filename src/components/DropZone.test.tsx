import { fireEvent, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it, vi } from 'vitest';
import { DropZone } from './DropZone.tsx';

const file = new File(['<svg/>'], 'tray.svg', { type: 'image/svg+xml' });
const show = (onFile: (file: File) => void) =>
  render(<DropZone label="Drop an SVG here" hint="At most 10 MB" onFile={onFile} />);
const zone = () => screen.getByRole('region', { name: 'Drop an SVG here' });
const paste = (target: Element, text: string) =>
  fireEvent.paste(target, { clipboardData: { files: [], getData: () => text } });

describe('DropZone', () => {
  it('takes a dropped file', () => {
    const onFile = vi.fn();
    show(onFile);
    fireEvent.dragOver(zone());
    expect(screen.getByText('Let go to read it')).toBeInTheDocument();
    fireEvent.drop(zone(), { dataTransfer: { files: [file] } });
    expect(onFile).toHaveBeenCalledExactlyOnceWith(file);
  });

  it('takes a chosen file', async () => {
    const onFile = vi.fn();
    show(onFile);
    await userEvent.upload(screen.getByLabelText('Drop an SVG here', { selector: 'input' }), file);
    expect(onFile).toHaveBeenCalledExactlyOnceWith(file);
  });

  it('takes pasted markup as a file', async () => {
    const onFile = vi.fn<(file: File) => void>();
    show(onFile);
    paste(document.body, '<?xml version="1.0"?><svg xmlns="http://www.w3.org/2000/svg"/>');
    const pasted = onFile.mock.lastCall?.[0];
    expect(pasted?.name).toBe('pasted.svg');
    expect(pasted?.type).toBe('image/svg+xml');
  });

  it('leaves other text and text fields alone', () => {
    const onFile = vi.fn();
    render(<input aria-label="Title" />);
    show(onFile);
    paste(document.body, 'only words');
    paste(screen.getByLabelText('Title'), '<svg/>');
    expect(onFile).not.toHaveBeenCalled();
  });

  it('shows how far a file has gone and can be stopped; takes no second one meanwhile', async () => {
    const onFile = vi.fn();
    const onCancel = vi.fn();
    render(
      <DropZone
        label="Drop an SVG here"
        hint=""
        onFile={onFile}
        sending={{ name: 'tray.svg', share: 0.4 }}
        onCancel={onCancel}
      />,
    );
    expect(screen.getByRole('progressbar', { name: 'Sending tray.svg' })).toHaveAttribute(
      'aria-valuenow',
      '40',
    );
    fireEvent.drop(zone(), { dataTransfer: { files: [file] } });
    paste(document.body, '<svg/>');
    expect(onFile).not.toHaveBeenCalled();
    await userEvent.click(screen.getByRole('button', { name: 'Cancel' }));
    expect(onCancel).toHaveBeenCalledOnce();
  });
});
