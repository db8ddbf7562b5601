import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { Link, useNavigate } from 'react-router-dom';
import { signUpFields } from '../../../shared/contracts/accounts.ts';
import { homeOf } from '../../app/navigation.ts';
import { Button } from '../../components/button.tsx';
import { CautionPanel } from '../../components/caution-panel.tsx';
import { Page } from '../../components/page.tsx';
import { TextField } from '../../components/text-field.tsx';
import { useSignUp } from './api/use-sign-up.ts';
import { FormProblem } from './components/form-problem.tsx';

export const Component = () => {
  const signUp = useSignUp();
  const navigate = useNavigate();
  const { register, handleSubmit, formState } = useForm({
    resolver: zodResolver(signUpFields),
    defaultValues: { name: '', email: '', password: '' },
  });
  const submit = handleSubmit((fields) =>
    signUp.mutate(fields, {
      onSuccess: ({ signedIn, keptAttempt }) =>
        void navigate(keptAttempt ? `/attempts/${keptAttempt}` : homeOf(signedIn.role)),
    }),
  );
  const { errors } = formState;
  return (
    <Page
      title="Create an account"
      lead="If you worked a practice job in this browser, it comes with you."
      isNarrow
    >
      <form
        noValidate
        onSubmit={(event) => void submit(event)}
        className="grid max-w-[420px] gap-4"
      >
        <TextField
          label="Name"
          hint="As your instructor knows you."
          autoComplete="name"
          error={errors.name && 'Enter your name, at most 80 characters.'}
          {...register('name')}
        />
        <TextField
          label="E-mail"
          type="email"
          autoComplete="username"
          error={errors.email && 'Enter an e-mail address, such as name@school.example.'}
          {...register('email')}
        />
        <TextField
          label="Password"
          hint="At least 10 characters. A few words in a row are easy to keep in mind."
          type="password"
          autoComplete="new-password"
          error={errors.password && 'Enter 10 to 128 characters.'}
          {...register('password')}
        />
        <FormProblem problem={signUp.error} />
        <div className="flex flex-wrap items-center gap-4">
          <Button type="submit" look="main" busy={signUp.isPending && 'Creating your account'}>
            Create account
          </Button>
          <Link to="/sign-in" className="font-semibold text-act underline underline-offset-2">
            I have an account
          </Link>
        </div>
      </form>
      <CautionPanel />
    </Page>
  );
};
