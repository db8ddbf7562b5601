import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { Link, useNavigate, useSearchParams } from 'react-router-dom';
import { signInFields } from '../../../shared/contracts/accounts.ts';
import { homeOf } from '../../app/navigation.ts';
import { Button } from '../../components/button.tsx';
import { CautionPanel } from '../../components/caution-panel.tsx';
import { Page } from '../../components/page.tsx';
import { TextField } from '../../components/text-field.tsx';
import { useSignIn } from './api/use-sign-in.ts';
import { FormProblem } from './components/form-problem.tsx';
import { nextPath } from './next-path.ts';

export const Component = () => {
  const signIn = useSignIn();
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const { register, handleSubmit, formState } = useForm({
    resolver: zodResolver(signInFields),
    defaultValues: { email: '', password: '' },
  });
  const submit = handleSubmit((fields) =>
    signIn.mutate(fields, {
      onSuccess: ({ signedIn }) =>
        void navigate(nextPath(search.get('then'), homeOf(signedIn.role))),
    }),
  );
  return (
    <Page title="Sign in" isNarrow>
      <form
        noValidate
        onSubmit={(event) => void submit(event)}
        className="grid max-w-[420px] gap-4"
      >
        <TextField
          label="E-mail"
          type="email"
          autoComplete="username"
          error={formState.errors.email && 'Enter an e-mail address, such as name@school.example.'}
          {...register('email')}
        />
        <TextField
          label="Password"
          type="password"
          autoComplete="current-password"
          error={formState.errors.password && 'Enter your password.'}
          {...register('password')}
        />
        <FormProblem problem={signIn.error} />
        <div className="flex flex-wrap items-center gap-4">
          <Button type="submit" look="main" busy={signIn.isPending && 'Signing in'}>
            Sign in
          </Button>
          <Link to="/sign-up" className="font-semibold text-act underline underline-offset-2">
            Create an account
          </Link>
        </div>
      </form>
      <CautionPanel />
    </Page>
  );
};
