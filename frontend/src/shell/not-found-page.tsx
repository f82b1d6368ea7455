import { Link } from 'react-router-dom';
import { Page } from '../components/page';

export function NotFoundPage() {
  return (
    <Page title="Nothing is here" lead="The address leads nowhere; perhaps part of it was lost on the way.">
      <Link to="/find">To Find</Link>
    </Page>
  );
}
