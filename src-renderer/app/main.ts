import '@fontsource/ibm-plex-sans-condensed/latin-400.css'
import '@fontsource/ibm-plex-sans-condensed/latin-600.css'
import './paper.css'
import { createApp } from 'vue'
import { findBridge } from '../bridge/findBridge'
import App from './App.vue'

createApp(App, { bridge: findBridge(window) }).mount('#app')
