import { createContext } from 'react';

/** What the mat does for whoever stands beside it. */
export interface MatHands {
  /** A tool dragged from the dock moves over the bench; client px. */ hover: (
    x: number,
    y: number,
  ) => void;
  /** It is let go. */ drop: (x: number, y: number) => void;
  /** Escape: undoes what a pointer began; false when there was nothing. */ cancel: () => boolean;
}

export interface MatLink extends MatHands {
  /** The mat offers its hands; returns what takes them back. */ offer: (
    hands: MatHands,
  ) => () => void;
}

/** Ties the dock and the keys to the mat, which comes and goes. */
export function matLink(): MatLink {
  let hands: MatHands | null = null;
  return {
    hover: (x, y) => hands?.hover(x, y),
    drop: (x, y) => hands?.drop(x, y),
    cancel: () => hands?.cancel() ?? false,
    offer: (offered) => {
      hands = offered;
      return () => {
        if (hands === offered) hands = null;
      };
    },
  };
}

export const MatContext = createContext<MatLink>(matLink());
