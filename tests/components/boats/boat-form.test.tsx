import { cleanup, fireEvent, render, screen, waitFor, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { BoatForm } from '@/components/boats/boat-form';
import type { SaveBoat, SaveBoatRequest } from '@/components/boats/save-boat';
import { sheetToForm } from '@/components/boats/sheet-to-form';
import { aBoatSheet } from '../../builders/boat-sheet';

const push = vi.fn();
vi.mock('next/navigation', () => ({ useRouter: () => ({ push }) }));

beforeEach(() => push.mockClear());
afterEach(cleanup);

function show(save: SaveBoat = () => Promise.resolve({ kind: 'saved', boatId: 'b', number: 4 })) {
  const sent: SaveBoatRequest[] = [];
  const spy: SaveBoat = (request) => {
    sent.push(request);
    return save(request);
  };
  render(<BoatForm initial={sheetToForm('Tern', aBoatSheet())} boatId="b" basedOnNumber={3} save={spy} />);
  return { sent };
}

const field = (label: string, at = 0) => screen.getAllByLabelText<HTMLInputElement>(label)[at]!;
const type = (input: HTMLInputElement, value: string) => fireEvent.change(input, { target: { value } });
const save = () => fireEvent.click(screen.getByRole('button', { name: 'Save as boat sheet 4' }));

describe('BoatForm', () => {
  it('sends what was typed, based on the version that was open, and goes to read it', async () => {
    const { sent } = show();
    type(field('Span, m'), '3,2');
    save();
    await waitFor(() => expect(push).toHaveBeenCalledWith('/boats/b?saved=4'));
    expect(sent[0]).toMatchObject({ boatId: 'b', basedOnNumber: 3, name: 'Tern', sheet: { spanM: 3.2 } });
  });

  it('says what is missing at the field and at the top, sends nothing and keeps what was typed', async () => {
    const { sent } = show();
    type(field('Span, m'), '');
    type(field('Mass, kg', 1), '80 stone');
    type(field('Boat name'), 'Tern the second');
    save();
    const summary = await screen.findByTestId('error-summary');
    expect(
      within(summary)
        .getAllByRole('link')
        .map((link) => link.textContent),
    ).toEqual([
      'Span between the centrelines of vaka and ama: give a number in m, 0.3 to 15 m.',
      'Ama — Mass: give a number in kg, 0 to 5000 kg.',
    ]);
    expect(field('Span, m').getAttribute('aria-invalid')).toBe('true');
    expect(document.activeElement).toBe(summary);
    expect([field('Mass, kg', 1).value, field('Boat name').value]).toEqual(['80 stone', 'Tern the second']);
    expect(sent).toHaveLength(0);
  });

  it('leads from the summary to the field', async () => {
    show();
    type(field('Span, m'), '300');
    save();
    fireEvent.click(await screen.findByRole('link', { name: /Span.*300 is over the possible/ }));
    expect(document.activeElement).toBe(field('Span, m'));
  });

  it('speaks of the chosen way of giving the pressure alone', async () => {
    show();
    fireEvent.click(screen.getByLabelText('the shed’s rule, kg/m² at a wind'));
    save();
    const summary = await screen.findByTestId('error-summary');
    const links = within(summary)
      .getAllByRole('link')
      .map((link) => link.getAttribute('href'));
    expect(links).toEqual(['#f-sheet-pressure-kgPerM2', '#f-sheet-pressure-atKn']);
  });

  it('puts the server’s messages at their fields', async () => {
    const problems = [{ pointer: '/sheet/masses/2/kg', message: 'Mass: the server does not believe it.' }];
    show(() => Promise.resolve({ kind: 'fields', problems }));
    type(field('Mass, kg', 2), '76');
    save();
    await screen.findByTestId('error-summary');
    expect(field('Mass, kg', 2).getAttribute('aria-invalid')).toBe('true');
    expect(field('Mass, kg', 2).value).toBe('76');
  });

  it('keeps everything at a conflict and can save it as the next version', async () => {
    const answers: Awaited<ReturnType<SaveBoat>>[] = [
      { kind: 'conflict', message: 'Mara saved version 6 meanwhile.', newestNumber: 6 },
      { kind: 'saved', boatId: 'b', number: 7 },
    ];
    const { sent } = show(() => Promise.resolve(answers.shift()!));
    type(field('Span, m'), '3.1');
    save();
    expect((await screen.findByRole('alert')).textContent).toContain('Mara saved version 6 meanwhile.');
    expect(field('Span, m').value).toBe('3.1');
    fireEvent.click(screen.getByRole('button', { name: 'Save mine as boat sheet 7' }));
    await waitFor(() => expect(push).toHaveBeenCalledWith('/boats/b?saved=7'));
    expect(sent.map(({ basedOnNumber }) => basedOnNumber)).toEqual([3, 6]);
  });

  it('keeps everything where the server cannot be reached or the session ended', async () => {
    const answers: SaveBoat[] = [
      () => Promise.reject(new Error('offline')),
      () => Promise.resolve({ kind: 'signed-out' }),
    ];
    show((request) => answers.shift()!(request));
    type(field('Span, m'), '3.3');
    save();
    expect((await screen.findByRole('alert')).textContent).toContain('could not be reached');
    save();
    await waitFor(() => expect(screen.getByRole('alert').textContent).toContain('you are signed out'));
    expect(field('Span, m').value).toBe('3.3');
    expect(push).not.toHaveBeenCalled();
  });

  it('moves, takes out and puts back a mass by its buttons', async () => {
    show();
    const items = () => screen.getAllByLabelText<HTMLInputElement>('Item').map(({ value }) => value);
    fireEvent.click(screen.getByRole('button', { name: 'Move Helm up' }));
    await waitFor(() => expect(items()).toEqual(['Vaka', 'Helm', 'Ama']));
    await waitFor(() => expect(document.activeElement?.getAttribute('aria-label')).toBe('Move Helm up'));
    fireEvent.click(screen.getByRole('button', { name: 'Take Helm out' }));
    await waitFor(() => expect(items()).toEqual(['Vaka', 'Ama']));
    fireEvent.click(screen.getByRole('button', { name: 'Put Helm back' }));
    await waitFor(() => expect(items()).toEqual(['Vaka', 'Helm', 'Ama']));
    expect(field('Mass, kg', 1).value).toBe('75');
  });

  it('works her figures while typing', async () => {
    show();
    const figures = screen.getByRole('complementary');
    expect(figures.textContent).toContain('330 kg·m');
    type(field('Mass, kg', 1), '100');
    await waitFor(() => expect(figures.textContent).toContain('390 kg·m'));
    type(field('Mass, kg', 1), '');
    await waitFor(() => expect(figures.textContent).toContain('not known'));
  });

  it('offers both published margins by name', () => {
    show();
    fireEvent.click(screen.getByRole('button', { name: /70 % of the wind that lifts the ama/ }));
    expect(field('Working margin, ×').value).toBe('2.04');
  });
});
