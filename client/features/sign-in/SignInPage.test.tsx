import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { expect, it } from 'vitest';

import { fakeServer, refusal } from '../../app/testing/fakeServer.ts';
import { renderAt } from '../../app/testing/renderAt.tsx';
import { sampleAnswers, session } from '../../app/testing/sampleBuilding.ts';

async function fillIn(address: string, password: string) {
  const user = userEvent.setup();
  await user.type(await screen.findByLabelText('Email'), address);
  await user.type(screen.getByLabelText('Password'), password);
  await user.click(screen.getByRole('button', { name: 'Sign in' }));
}

it('signs in and goes to the address that was asked for', async () => {
  const server = fakeServer({ ...sampleAnswers(), 'POST /api/session': { body: session('engineer') } });
  const { router } = renderAt('/sign-in?to=%2Fbuildings%2Fb1%2Finputs%2Flevels');
  await fillIn('engineer@demo.example', 'a password');
  expect(await screen.findByRole('grid', { name: 'Levels' })).toBeInTheDocument();
  expect(router.state.location.pathname).toBe('/buildings/b1/inputs/levels');
  const sent = server.of('POST /api/session')[0];
  expect(sent?.body).toEqual({ email: 'engineer@demo.example', password: 'a password' });
  expect(sent?.headers.get('X-Requested-With')).toBe('groundward');
});

it('never leads out of the application', async () => {
  fakeServer({ ...sampleAnswers(), 'POST /api/session': { body: session('engineer') } });
  const { router } = renderAt('/sign-in?to=%2F%2Felsewhere.example');
  await fillIn('engineer@demo.example', 'a password');
  expect(await screen.findByRole('heading', { name: 'Buildings' })).toBeInTheDocument();
  expect(router.state.location.pathname).toBe('/buildings');
});

it('says that email and password do not belong together, and lets the person go on', async () => {
  fakeServer({ 'POST /api/session': refusal(401, 'wrong-credentials') });
  renderAt('/sign-in');
  await fillIn('engineer@demo.example', 'wrong');
  expect(await screen.findByText(/Email and password do not belong together/)).toBeInTheDocument();
  expect(screen.getByLabelText('Password')).toHaveAttribute('aria-invalid', 'true');
  expect(screen.getByLabelText('Email')).toHaveValue('engineer@demo.example');
});

it('asks for what is blank before it asks the server', async () => {
  const server = fakeServer({});
  renderAt('/sign-in');
  await userEvent.click(await screen.findByRole('button', { name: 'Sign in' }));
  expect(screen.getByText('Email is blank; enter the address of your account.')).toBeInTheDocument();
  expect(server.asked).toEqual([]);
});

it('leads here from any page without a session, and remembers the page', async () => {
  fakeServer({ 'GET /api/session': refusal(401, 'no-session') });
  const { router } = renderAt('/buildings/b1/schedule?wall=W1');
  expect(await screen.findByRole('button', { name: 'Sign in' })).toBeInTheDocument();
  expect(new URLSearchParams(router.state.location.search).get('to')).toBe('/buildings/b1/schedule?wall=W1');
});
