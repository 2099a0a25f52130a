import { AuthError } from '../../client/session';
import { useWords } from '../../ui/words';

/** Words for why a form of signing in did not go. */
export function useAuthProblem(): (error: unknown) => string {
  const t = useWords();
  return (error) => t(`auth.problems.${error instanceof AuthError ? error.problem : 'broken'}`);
}
