// The first thing that runs in the app: routes are loaded apart and in no fixed order, and each may
// make schemas.
import './components/data/no-eval';
import 'expo-router/entry';
