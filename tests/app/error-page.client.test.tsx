import { render, screen } from '@testing-library/react';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { ErrorPage } from '../../src/app/error-page.tsx';

const show = (error: Error): void => {
  // React reports what a boundary caught; here it is what the test is about.
  vi.spyOn(console, 'error').mockImplementation(() => undefined);
  const Broken = (): never => {
    throw error;
  };
  const routes = [{ path: '/', Component: Broken, ErrorBoundary: ErrorPage }];
  render(<RouterProvider router={createMemoryRouter(routes)} />);
};

afterEach(() => vi.restoreAllMocks());

describe('the error page', () => {
  it('says what to do and shows nothing of the error itself', async () => {
    show(new Error('cannot read properties of undefined'));
    expect(await screen.findByRole('heading', { name: 'This page broke' })).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Reload the page' })).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Go to the start page' })).toBeInTheDocument();
    expect(document.body).not.toHaveTextContent(/undefined|\.tsx?/);
  });

  it('knows when the code of the page did not arrive', async () => {
    show(new TypeError('Failed to fetch dynamically imported module: /assets/jobs.js'));
    expect(
      await screen.findByRole('heading', { name: 'This page did not arrive' }),
    ).toBeInTheDocument();
    expect(document.body).not.toHaveTextContent('/assets/');
  });
});
