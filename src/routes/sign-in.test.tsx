import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { answerCalls, showPage } from '../../tests/support/answered-page.tsx';
import { Component } from './sign-in.tsx';

afterEach(() => vi.unstubAllGlobals());

const noSession = { 'GET /api/auth/get-session': { status: 200, body: null } };
const wren = {
  status: 200,
  body: { id: '1', name: 'Wren', email: 'wren@club.example', role: 'member', club: { name: 'Millrace' } },
};

async function signIn() {
  const user = userEvent.setup();
  await user.type(screen.getByLabelText('E-mail'), ' wren@club.example ');
  await user.type(screen.getByLabelText('Password'), 'a password');
  await user.click(screen.getByRole('button', { name: 'Sign in' }));
}

describe('signing in', () => {
  it('names the fields that are empty and puts the cursor into the first', async () => {
    const sent = answerCalls(noSession);
    showPage('/sign-in', <Component />);
    await userEvent.click(screen.getByRole('button', { name: 'Sign in' }));
    const email = screen.getByLabelText('E-mail');
    expect(email).toBeInvalid();
    expect(email).toHaveAccessibleDescription(/Type an address such as name@example\.org/);
    expect(screen.getByLabelText('Password')).toHaveAccessibleDescription(/Type your password/);
    expect(email).toHaveFocus();
    expect(sent.map(({ call }) => call)).toEqual(['GET /api/auth/get-session']);
  });

  it('says at the password why the server refused', async () => {
    answerCalls({
      ...noSession,
      'POST /api/auth/sign-in/email': {
        status: 401,
        body: {
          type: 'sign-in.refused',
          title: 'No',
          status: 401,
          detail: 'E-mail or password is not right.',
        },
      },
    });
    showPage('/sign-in', <Component />);
    await signIn();
    expect(await screen.findByText('E-mail or password is not right.')).toBeVisible();
    const password = screen.getByLabelText('Password');
    expect(password).toHaveAccessibleDescription(/E-mail or password is not right/);
    expect(password).toHaveFocus();
  });

  it('shows a refusal that is about no field', async () => {
    const detail = 'Your membership is suspended.';
    answerCalls({
      ...noSession,
      'POST /api/auth/sign-in/email': {
        status: 403,
        body: { type: 'member.suspended', title: 'This is not allowed', status: 403, detail },
      },
    });
    showPage('/sign-in', <Component />);
    await signIn();
    expect(await screen.findByRole('alert')).toHaveTextContent(detail);
  });

  it('goes on to the page that was asked for', async () => {
    let isIn = false;
    const sent = answerCalls({
      'GET /api/auth/get-session': () => ({ status: 200, body: isIn ? {} : null }),
      'GET /api/me': wren,
      'POST /api/auth/sign-in/email': () => {
        isIn = true;
        return { status: 200, body: {} };
      },
    });
    showPage('/sign-in?next=%2Fbench%3Fadd%3Dbit', <Component />);
    await signIn();
    expect(await screen.findByText('now at /bench?add=bit')).toBeVisible();
    expect(sent.find(({ call }) => call.startsWith('POST'))?.body).toEqual({
      email: 'wren@club.example',
      password: 'a password',
    });
  });
});
