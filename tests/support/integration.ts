import './loadEnvironment'
