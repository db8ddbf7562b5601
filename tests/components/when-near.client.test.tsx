import { act, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { WhenNear } from '../../src/components/when-near.tsx';

type Tell = (entries: { isIntersecting: boolean }[]) => void;

/** An observer whose news the test gives. */
const watchers = (): { tell: Tell[]; disconnected: number } => {
  const seen = { tell: [] as Tell[], disconnected: 0 };
  vi.stubGlobal(
    'IntersectionObserver',
    class {
      constructor(tell: Tell) {
        seen.tell.push(tell);
      }
      observe(): void {}
      disconnect(): void {
        seen.disconnected += 1;
      }
    },
  );
  return seen;
};

afterEach(() => vi.unstubAllGlobals());

describe('WhenNear', () => {
  it('renders nothing costly until it comes near, and then keeps it', () => {
    const seen = watchers();
    render(<WhenNear what="the bench">bench and meter</WhenNear>);
    expect(screen.getByRole('button', { name: 'Show the bench' })).toBeInTheDocument();
    act(() => seen.tell[0]?.([{ isIntersecting: false }]));
    expect(screen.queryByText('bench and meter')).not.toBeInTheDocument();
    act(() => seen.tell[0]?.([{ isIntersecting: true }]));
    expect(screen.getByText('bench and meter')).toBeInTheDocument();
    expect(seen.disconnected).toBe(1);
  });

  it('renders at once what is wanted, and keeps it when it is wanted no more', () => {
    watchers();
    const { rerender } = render(
      <WhenNear isWanted what="the bench">
        bench and meter
      </WhenNear>,
    );
    expect(screen.getByText('bench and meter')).toBeInTheDocument();
    rerender(<WhenNear what="the bench">bench and meter</WhenNear>);
    expect(screen.getByText('bench and meter')).toBeInTheDocument();
  });

  it('renders on request', () => {
    watchers();
    render(<WhenNear what="the bench">bench and meter</WhenNear>);
    fireEvent.click(screen.getByRole('button', { name: 'Show the bench' }));
    expect(screen.getByText('bench and meter')).toBeInTheDocument();
  });
});
