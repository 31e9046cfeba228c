import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { signInSchema, type SignIn } from '../../../shared/schemas/session.ts';
import { ApiError } from '../../lib/api.ts';
import { useSignIn } from '../../lib/session.ts';
import { Button } from '../../ui/Button.tsx';
import { TextField } from '../../ui/TextField.tsx';

/** @param done - called once the person is signed in */
export function SignInForm({ done }: { done: () => void }) {
  const { signIn } = useSignIn();
  const [refusal, setRefusal] = useState<string | null>(null);
  const { register, handleSubmit, formState } = useForm<SignIn>({
    resolver: zodResolver(signInSchema),
  });
  const submit = handleSubmit(async (credentials) => {
    setRefusal(null);
    try {
      await signIn(credentials);
      done();
    } catch (error) {
      setRefusal(error instanceof ApiError ? error.message : 'Signing in failed. Try again.');
    }
  });
  return (
    <form noValidate onSubmit={(event) => void submit(event)} className="space-y-4">
      <TextField
        label="E-mail"
        type="email"
        autoComplete="username"
        autoFocus
        error={formState.errors.email && 'Enter your e-mail address.'}
        {...register('email')}
      />
      <TextField
        label="Password"
        type="password"
        autoComplete="current-password"
        error={formState.errors.password && 'Enter your password.'}
        {...register('password')}
      />
      <p role="alert" className="text-lost empty:hidden">
        {refusal}
      </p>
      <Button type="submit" look="primary" busy={formState.isSubmitting} className="w-full">
        Sign in
      </Button>
    </form>
  );
}
