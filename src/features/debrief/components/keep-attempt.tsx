import { ButtonLink } from '../../../components/button-link.tsx';
import { Notice } from '../../../components/notice.tsx';
import { useSignedIn } from '../../account/api/use-signed-in.ts';

/** For a visitor: the attempt lives in a cookie of this browser until an account takes it. */
export const KeepAttempt = () => {
  const { data: signedIn } = useSignedIn();
  if (signedIn !== null) return null;
  return (
    <Notice kind="plain" title="Keep this attempt">
      <p>Without an account only this browser knows it. Create one, and it comes with you.</p>
      <div>
        <ButtonLink to="/sign-up" isSmall>
          Create an account and keep it
        </ButtonLink>
      </div>
    </Notice>
  );
};
