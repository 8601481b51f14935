import { withNext } from '#contracts/local-path.ts';
import { buttonClass } from '#src/components/button.tsx';

/** Leaves the site for GitHub: a plain link, since a form may not be sent on to another site. */
export function GithubButton({ next, children }: { next: string; children: string }) {
  return <a href={withNext('/sign-in/github', next)} className={buttonClass('plain')}>{children}</a>;
}
