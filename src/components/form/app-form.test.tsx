import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useForm } from 'react-hook-form';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { AppForm } from '#src/components/form/app-form.tsx';
import { TextArea } from '#src/components/form/text-area.tsx';
import { TextField } from '#src/components/form/text-field.tsx';
import { ApiProblem } from '#src/lib/api/api-problem.ts';

type Values = { reason: string; dueOn: string };

function Page({ onSubmit }: { onSubmit: (values: Values) => Promise<unknown> }) {
  const form = useForm<Values>({ defaultValues: { reason: '', dueOn: '' } });
  return (
    <AppForm form={form} onSubmit={onSubmit} draftKey="reject 17-0417">
      <TextArea name="reason" label="Reason" rules={{ required: 'Say what is due' }} />
      <TextField name="dueOn" label="Due on" rules={{ required: 'Say by when' }} />
      <button type="submit">Reject</button>
    </AppForm>
  );
}

const accept = () => Promise.resolve();

beforeEach(() => sessionStorage.clear());
afterEach(cleanup);

describe('AppForm', () => {
  it('lists what is wrong at the top in the words beside the fields, takes focus there and leads to the field', async () => {
    const user = userEvent.setup();
    render(<Page onSubmit={accept} />);
    await user.click(screen.getByRole('button', { name: 'Reject' }));
    const summary = await screen.findByRole('alert');
    expect(summary.textContent).toContain('2 things stand in the way');
    expect(document.activeElement).toBe(summary);
    expect(screen.getAllByText('Say what is due')).toHaveLength(2);
    await user.click(screen.getByRole('button', { name: 'Say by when' }));
    const field = screen.getByRole('textbox', { name: 'Due on' });
    expect(document.activeElement).toBe(field);
    expect(field.getAttribute('aria-invalid')).toBe('true');
    const told = document.getElementById(field.getAttribute('aria-describedby') ?? '');
    expect(told?.textContent).toBe('Say by when');
  });

  it('puts what the server refuses beside the field that it names, the rest in the summary', async () => {
    const user = userEvent.setup();
    const refuse = () =>
      Promise.reject(
        new ApiProblem({
          status: 422,
          code: 'invalid',
          detail: 'The decision was not stored.',
          errors: [
            { pointer: '/dueOn', code: 'past', detail: 'The day has passed: choose a later one' },
            { pointer: '', code: 'taken', detail: 'Another inspector has taken the batch' },
          ],
        }),
      );
    render(<Page onSubmit={refuse} />);
    await user.type(screen.getByRole('textbox', { name: 'Reason' }), 'too short');
    await user.type(screen.getByRole('textbox', { name: 'Due on' }), '2020-01-01');
    await user.click(screen.getByRole('button', { name: 'Reject' }));
    const summary = await screen.findByRole('alert');
    expect(summary.textContent).toContain('Another inspector has taken the batch');
    expect(screen.getAllByText('The day has passed: choose a later one')).toHaveLength(2);
  });

  it('gives back what was typed before the page was left, until it is sent', async () => {
    const user = userEvent.setup();
    const first = render(<Page onSubmit={accept} />);
    await user.type(screen.getByRole('textbox', { name: 'Reason' }), 'water stood higher');
    first.unmount();
    const second = render(<Page onSubmit={accept} />);
    expect(screen.getByRole<HTMLTextAreaElement>('textbox', { name: 'Reason' }).value).toBe(
      'water stood higher',
    );
    await user.type(screen.getByRole('textbox', { name: 'Due on' }), '2026-05-01');
    await user.click(screen.getByRole('button', { name: 'Reject' }));
    second.unmount();
    render(<Page onSubmit={accept} />);
    expect(screen.getByRole<HTMLTextAreaElement>('textbox', { name: 'Reason' }).value).toBe('');
  });
});
