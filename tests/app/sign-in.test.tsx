import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { safePath } from '@/app/sign-in/_components/safe-path';
import { SignInForm } from '@/app/sign-in/_components/sign-in-form';

const { push, refresh, signIn } = vi.hoisted(() => ({
  push: vi.fn(),
  refresh: vi.fn(),
  signIn: vi.fn(),
}));
vi.mock('next/navigation', () => ({ useRouter: () => ({ push, refresh }) }));
vi.mock('next-auth/react', () => ({ signIn }));

beforeEach(() => {
  vi.clearAllMocks();
});

describe('where signing in leads', () => {
  it('follows paths of this site', () => {
    expect(safePath('/today')).toBe('/today');
    expect(safePath('/classes/1?lesson=pantograph#x')).toBe('/classes/1?lesson=pantograph#x');
  });

  it.each([
    '//elsewhere.example',
    '/\\elsewhere.example',
    'https://elsewhere.example/',
    'javascript:alert(1)',
    '/a\\b',
    '/a\nb',
    '/sign-in?from=%2Fsign-in',
    '/api/attempts',
    'today',
    '',
    `/${'a'.repeat(600)}`,
    undefined,
    ['/today'],
  ])('refuses %j', (from) => {
    expect(safePath(from)).toBeNull();
  });
});

async function fillAndSend(): Promise<void> {
  const user = userEvent.setup();
  await user.type(screen.getByLabelText('E-mail'), 'marit@example.org');
  await user.type(screen.getByLabelText('Password'), 'six brass pins');
  await user.click(screen.getByRole('button', { name: 'Sign in' }));
}

describe('the sign-in form', () => {
  it('goes on to where one came from, forgetting what was seen while signed out', async () => {
    signIn.mockResolvedValue({ ok: true, error: null });
    render(<SignInForm next="/classes" />);
    await fillAndSend();
    expect(signIn).toHaveBeenCalledWith('credentials', {
      email: 'marit@example.org',
      password: 'six brass pins',
      redirect: false,
    });
    expect(push).toHaveBeenCalledWith('/classes');
    expect(refresh.mock.invocationCallOrder[0]).toBeLessThan(push.mock.invocationCallOrder[0] ?? 0);
  });

  it('keeps the address when refused and puts the hand on the password', async () => {
    signIn.mockResolvedValue({ ok: false, error: 'CredentialsSignin' });
    render(<SignInForm next="/today" />);
    await fillAndSend();
    expect(await screen.findByRole('alert')).toHaveTextContent('do not fit together');
    expect(screen.getByLabelText('E-mail')).toHaveValue('marit@example.org');
    expect(screen.getByLabelText('Password')).toHaveFocus();
    expect(push).not.toHaveBeenCalled();
  });

  it('says when to come back after too many tries', async () => {
    signIn.mockResolvedValue({ ok: false, error: 'throttled' });
    render(<SignInForm next="/today" />);
    await fillAndSend();
    expect(await screen.findByRole('alert')).toHaveTextContent('a quarter of an hour');
  });

  it('says that the network is away when nothing answers', async () => {
    signIn.mockRejectedValue(new TypeError('failed'));
    render(<SignInForm next="/today" />);
    await fillAndSend();
    expect(await screen.findByRole('alert')).toHaveTextContent('network is away');
  });

  it('lets password managers fill it', () => {
    render(<SignInForm next="/today" />);
    expect(screen.getByLabelText('E-mail')).toHaveAttribute('autocomplete', 'username');
    expect(screen.getByLabelText('Password')).toHaveAttribute('autocomplete', 'current-password');
  });
});
