import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { signInRequest, type SignInRequest } from '#shared/contracts/session.ts';
import { useSignIn } from '#src/api/session.ts';
import { Button } from '#src/ui/button.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { applyProblem } from '../../parts/apply-problem.ts';
import { FormProblem } from '../../parts/form-problem.tsx';
import { useWait, waitOf } from './use-wait.ts';

/** Name and password; what was typed stays after a refusal, and the wait after several is counted down. */
export const SignInForm = () => {
  const signIn = useSignIn();
  const [waitS, startWait] = useWait();
  const { register, handleSubmit, setError, formState } = useForm<SignInRequest>({
    resolver: zodResolver(signInRequest),
    defaultValues: { login: '', password: '' },
  });
  const { errors } = formState;
  const submit = handleSubmit(async (request) => {
    if (waitS > 0) return;
    try {
      await signIn.mutateAsync(request);
    } catch (error) {
      const seconds = waitOf(error);
      if (seconds > 0) startWait(seconds);
      else applyProblem(error, ['login', 'password'], setError);
    }
  });
  const waiting =
    waitS > 0
      ? `Too many wrong tries. You can try again in ${waitS} ${waitS === 1 ? 'second' : 'seconds'}.`
      : undefined;
  return (
    <form noValidate onSubmit={(event) => void submit(event)} className="grid gap-5">
      <TextField
        label="Name"
        autoComplete="username"
        autoCapitalize="none"
        spellCheck={false}
        error={errors.login?.message}
        {...register('login')}
      />
      <TextField
        label="Password"
        type="password"
        autoComplete="current-password"
        error={errors.password?.message}
        {...register('password')}
      />
      <FormProblem sentence={waiting ?? errors.root?.server?.message} />
      <Button type="submit" kind={waitS > 0 ? 'blocked' : 'main'} busy={signIn.isPending}>
        {waitS > 0 ? `Opens again in ${waitS} s` : 'Sign in'}
      </Button>
    </form>
  );
};
