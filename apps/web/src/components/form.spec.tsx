import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { ApiProblem } from '../app/api-problem';
import { renderOnPage } from '../test-page';
import { ChoiceTiles } from './fields/choice-tiles';
import { NumberField } from './fields/number-field';
import { TextField } from './fields/text-field';
import { Form } from './form';
import { SubmitButton } from './submit-button';

const schema = z.object({
  name: z.string().min(1, 'Give a name.'),
  metres: z.number('Give the distance as a number.').min(1),
  weather: z.enum(['dry', 'wet']),
});
const weathers = [
  { value: 'dry', label: 'Dry' },
  { value: 'wet', label: 'Wet', hint: 'counts double' },
];

function show(onSubmit: (values: z.output<typeof schema>) => Promise<unknown>) {
  renderOnPage(
    <Form schema={schema} defaultValues={{ name: '', metres: 5000, weather: 'dry' }} onSubmit={onSubmit}>
      <TextField name="name" label="Name" help="As on the frame." />
      <NumberField name="metres" label="Distance" unit="km" scale={1000} whole />
      <ChoiceTiles name="weather" label="Weather" options={weathers} />
      <SubmitButton>Keep it</SubmitButton>
    </Form>,
  );
  return userEvent.setup();
}

const keep = () => screen.getByRole('button', { name: 'Keep it' });

describe('Form', () => {
  it('sends what the contract asks for: metres for kilometres typed with a comma, one tap for the weather', async () => {
    const send = vi.fn(() => Promise.resolve());
    const user = show(send);
    expect(screen.getByLabelText('Distance')).toHaveProperty('value', '5');
    await user.type(screen.getByLabelText('Name'), 'Gravel one');
    await user.clear(screen.getByLabelText('Distance'));
    await user.type(screen.getByLabelText('Distance'), '42,5');
    await user.click(screen.getByRole('radio', { name: /Wet/ }));
    await user.click(keep());
    expect(send).toHaveBeenCalledExactlyOnceWith({ name: 'Gravel one', metres: 42_500, weather: 'wet' });
  });

  it('sends nothing while a field is wrong, and ties the reason to the field', async () => {
    const send = vi.fn(() => Promise.resolve());
    const user = show(send);
    await user.clear(screen.getByLabelText('Distance'));
    await user.type(screen.getByLabelText('Distance'), 'far');
    await user.click(keep());
    expect(send).not.toHaveBeenCalled();
    const name = screen.getByLabelText('Name');
    expect(name.getAttribute('aria-invalid')).toBe('true');
    const reason = await screen.findByText('Give a name.');
    expect(name.getAttribute('aria-describedby')).toContain(reason.id);
    expect(screen.getByText('Give the distance as a number.')).toBeDefined();
  });

  it('shows what the server refuses beside the field, and the rest at the head', async () => {
    const refusal = new ApiProblem({
      type: 'about:blank',
      title: 'Check',
      status: 422,
      detail: 'Please check.',
      errors: [
        { path: 'name', message: 'That name is taken.' },
        { path: 'bikeId', message: 'The bike was removed.' },
      ],
    });
    const user = show(() => Promise.reject(refusal));
    await user.type(screen.getByLabelText('Name'), 'Twice');
    await user.click(keep());
    expect(await screen.findByText('That name is taken.')).toBeDefined();
    expect(screen.getByRole('alert').textContent).toBe('The bike was removed.');
  });
});
