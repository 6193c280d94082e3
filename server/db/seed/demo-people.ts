/** Invented people at example addresses. Their passwords are shown on the sign-in page, in demo mode only. */
export const demoPeople = [
  {
    role: 'engineer',
    name: 'Mirela Tosk',
    email: 'mirela.tosk@tannhollow.example',
    password: 'hazel-lantern-47',
    memberRoles: ['engineer'],
    company: null,
  },
  {
    role: 'admin',
    name: 'Jonas Brevik',
    email: 'jonas.brevik@tannhollow.example',
    password: 'copper-kettle-12',
    memberRoles: ['admin'],
    company: null,
  },
  {
    role: 'supplier',
    name: 'Adaeze Lindmark',
    email: 'adaeze.lindmark@veldrift.example',
    password: 'orchard-signal-83',
    memberRoles: ['supplier'],
    company: 'Veldrift Films',
  },
  {
    role: 'client',
    name: 'Corin Hallowby',
    email: 'corin.hallowby@marrowgate.example',
    password: 'granite-ribbon-56',
    memberRoles: ['client'],
    company: 'Marrowgate Grocers',
  },
  {
    role: 'engineer and admin',
    name: 'Sanna Oyelade',
    email: 'sanna.oyelade@tannhollow.example',
    password: 'meadow-compass-29',
    memberRoles: ['engineer', 'admin'],
    company: null,
  },
] as const;
