import { Remark, Remarks } from '../../components/Remarks';

export function RuleRemarks() {
  return (
    <Remarks about="the decision rule">
      <Remark><strong>Simple</strong> compares the value itself. <strong>Guarded</strong> wants it above the requirement by the guard band; without an uncertainty it gives no outcome.</Remark>
      <Remark weight="cite">ILAC-G8:09/2019 and JCGM 106 on decision rules.</Remark>
      <Remark>Between the ends of a segment the requirement is straight in the logarithm of frequency.</Remark>
      <Remark>A rule of thumb of this trade: at least 50 dB from 100 kHz to 1 GHz (common practice, no source).</Remark>
    </Remarks>
  );
}
