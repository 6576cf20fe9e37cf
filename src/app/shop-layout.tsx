import { Navigate, Outlet, useLocation, useParams } from 'react-router-dom';
import { FaultBox } from '../components/fault-box';
import { Waiting } from '../components/waiting';
import { paths } from '../lib/paths';
import { useSession, useShop } from '../lib/session';
import { NotFoundPage } from './not-found-page';
import { SignInAgain } from './sign-in-again';
import { Strip } from './strip';

/** Everything inside a shop: the strip, the page, and the sign-in that comes over a page whose session ran out. */
export function ShopLayout() {
  const { shop: slug } = useParams();
  const location = useLocation();
  const { data, isPending, error, refetch } = useSession();
  const shop = useShop(slug);
  if (isPending) return <Waiting words="Opening the shop" />;
  if (error) return <FaultBox fault={error} again={() => void refetch()} />;
  if (!data) return <Navigate to={paths.signIn(location.pathname + location.search)} replace />;
  return (
    <>
      <a className="skip" href="#page">
        Skip to the page
      </a>
      <Strip person={data.person.name} shop={shop} />
      {shop ? <Outlet /> : <NotFoundPage />}
      <SignInAgain />
    </>
  );
}
