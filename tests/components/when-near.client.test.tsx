import { act, render, screen } from '@testing-library/react';
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
    render(<WhenNear meanwhile="on its way">the bench</WhenNear>);
    expect(screen.getByText('on its way')).toBeInTheDocument();
    act(() => seen.tell[0]?.([{ isIntersecting: false }]));
    expect(screen.queryByText('the bench')).not.toBeInTheDocument();
    act(() => seen.tell[0]?.([{ isIntersecting: true }]));
    expect(screen.getByText('the bench')).toBeInTheDocument();
    expect(seen.disconnected).toBe(1);
  });
});
