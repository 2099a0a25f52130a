/** The pages with a form that someone who is not signed in sees. */
export { ForgotScreen } from '../auth/ForgotScreen';
export { ResetScreen } from '../auth/ResetScreen';
export { SignInScreen } from '../auth/SignInScreen';
export { SignUpScreen } from '../auth/SignUpScreen';
