import { Navigate } from 'react-router-dom';
import { Waiting } from '../components/waiting';
import { FaultBox } from '../components/fault-box';
import { paths } from '../lib/paths';
import { useSession } from '../lib/session';

/** The bare address: the first shop's drawings for somebody signed in, the sign-in sheet for anybody else. */
export function FirstPage() {
  const { data, isPending, error } = useSession();
  if (isPending) return <Waiting words="Opening the shop" />;
  if (error) return <FaultBox fault={error} />;
  const shop = data?.shops[0];
  return <Navigate to={shop ? paths.drawings(shop.slug) : paths.signIn()} replace />;
}
