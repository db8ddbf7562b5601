import { useRouteError } from 'react-router-dom';
import { Brand } from '../components/brand.tsx';
import { Button } from '../components/button.tsx';
import { Notice } from '../components/notice.tsx';

/** A page whose code did not arrive (another release, no network) ends here as a TypeError of import(). */
const isMissingCode = (error: unknown): boolean =>
  error instanceof TypeError && /import|module/i.test(error.message);

/** What stands when a page broke. It needs nothing that could be broken as well. */
export const ErrorPage = () => {
  const error = useRouteError();
  return (
    <main className="mx-auto grid max-w-[720px] gap-6 px-4 py-10">
      <title>Something broke – Coldbench</title>
      <a href="/" aria-label="Coldbench, start" className="justify-self-start">
        <Brand />
      </a>
      <h1 className="text-2xl font-bold">
        {isMissingCode(error) ? 'This page did not arrive' : 'This page broke'}
      </h1>
      <Notice kind="plain" isNews>
        <p>
          {isMissingCode(error)
            ? 'Its code could not be fetched: the connection was away, or Coldbench was updated meanwhile. Reload to fetch it again.'
            : 'The fault is ours, not yours. What you recorded on the bench is kept. Reload the page; if it breaks again, go to the start page and come back another way.'}
        </p>
        <div className="flex flex-wrap gap-3">
          <Button look="main" onClick={() => window.location.reload()}>
            Reload the page
          </Button>
          <Button onClick={() => window.location.assign('/')}>Go to the start page</Button>
        </div>
      </Notice>
    </main>
  );
};
