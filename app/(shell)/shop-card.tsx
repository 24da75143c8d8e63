export { ShopCardScreen as default } from '../../components/shop-card/shop-card-screen';
