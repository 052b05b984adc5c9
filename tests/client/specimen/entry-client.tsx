import './specimen.css'
import { hydrateRoot } from 'react-dom/client'
import { BrowserRouter } from 'react-router-dom'
import { Specimen } from './specimen'

const root = document.getElementById('root')
if (!root) throw new Error('The page has no root.')
hydrateRoot(
  root,
  <BrowserRouter>
    <Specimen />
  </BrowserRouter>,
)
