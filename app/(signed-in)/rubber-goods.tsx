import { GoodsScreen } from '@/components/register/GoodsScreen';

export default function RubberGoodsRoute() {
  return <GoodsScreen />;
}
