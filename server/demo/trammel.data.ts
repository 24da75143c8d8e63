/** What the maker says in the clip of the draft: the caption file as it would arrive. Invented. */
export const trammelTalk: { seconds: number; says: string }[] = [
  { seconds: 12, says: 'welcome back to the lane today a trammel for routing circles' },
  {
    seconds: 26,
    says: 'first cut the arm so the arm is six hundred by ninety by twelve mil ply and keep the offcut',
  },
  {
    seconds: 24,
    says: 'now we bore the pin holes every twenty four millimeters down the middle six millimeter bit',
  },
  {
    seconds: 26,
    says: 'next the router sits on the big end take the base plate off and mark the three holes',
  },
  {
    seconds: 28,
    says: 'now pull the plug before you touch the collet seat the cutter and slide the arm until it is two hundred and ninety millimeters from the pin',
  },
  {
    seconds: 26,
    says: 'then cut round in shallow passes three millimeters each time keep your hands on both grips and never reach under',
  },
  {
    seconds: 22,
    says: 'finally free the disc and clean the edge with one twenty grit that is it see you next time',
  },
];
