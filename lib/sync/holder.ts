/** Whose phone this is, and what the screens let that person do; only the server decides. */
export type Holder = {
  personId: string;
  personName: string;
  shopName: string;
  mayReport: boolean;
  mayMeasure: boolean;
  /** Of the shop: how things are called, and which clock its times are read by. */
  region: 'US' | 'UK' | 'AU' | 'EU';
  zone: string;
};
