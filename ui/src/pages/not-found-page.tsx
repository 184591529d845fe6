import { LinkButton } from '../components/button';
import { Page } from '../components/page';
import { paths } from '../paths';

export function NotFoundPage() {
  return (
    <Page
      title="There is no such page"
      lead="The address may be mistyped, or what it led to belongs to another firm or yard."
      actions={<LinkButton to={paths.work()}>Go to your work</LinkButton>}
    />
  );
}
