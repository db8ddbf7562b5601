import { Brand } from '../components/brand.tsx';

/** Stands until the code of the first page is here. */
export const FirstLoad = () => (
  <div role="status" aria-label="Loading the page">
    <div className="flex h-[52px] items-center border-b border-line bg-sheet px-4">
      <Brand />
    </div>
  </div>
);
