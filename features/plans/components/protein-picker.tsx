import { useState } from 'react';
import { Select } from '@/components/form';
import { Row } from '@/components/ui';
import { useFamilies, useProtein, useProteins } from '@/features/families';

interface ProteinPickerProps {
  projectId: string;
  value: string;
  onChange: (proteinId: string) => void;
  error?: string;
  name?: string;
}

/** A family, then one of its proteins. */
export function ProteinPicker({ projectId, value, onChange, error, name }: ProteinPickerProps) {
  const [turned, setTurned] = useState<string>();
  const families = useFamilies(projectId);
  const chosen = useProtein(projectId, value || null);
  const familyId = turned ?? chosen.data?.familyId ?? '';
  const proteins = useProteins(projectId, familyId || null);
  const filled = (families.data ?? []).filter(({ proteinCount }) => proteinCount > 0);
  return (
    <Row gap={12} wrap align="start">
      <div style={{ flex: '1 1 130px' }}>
        <Select
          label="Family"
          placeholder={
            families.data && filled.length === 0 ? 'No family has proteins yet' : 'Choose a family'
          }
          options={filled.map((family) => ({
            value: family.id,
            label: `${family.name}${family.description ? `, ${family.description}` : ''}`,
          }))}
          value={familyId}
          onChange={(next) => {
            setTurned(next);
            onChange('');
          }}
        />
      </div>
      <div style={{ flex: '2 1 220px' }}>
        <Select
          label="Protein"
          name={name}
          placeholder={familyId ? 'Choose a protein' : 'Choose a family first'}
          options={(proteins.data ?? []).map((protein) => ({
            value: protein.id,
            label: [...new Set([protein.organism, protein.name]), `${protein.length} residues`].join(', '),
          }))}
          value={value}
          onChange={onChange}
          error={error}
          required
        />
      </div>
    </Row>
  );
}
