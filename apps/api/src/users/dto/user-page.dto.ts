import { pageOf } from '../../common/paging';
import { UserView } from './user.dto';

/** One page of accounts. */
export class UserPage extends pageOf(UserView) {}
