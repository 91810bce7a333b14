// Where the page starts: the settings that must stand before the first schema is made, then the router.
import './no-made-code';
import 'expo-router/entry';
