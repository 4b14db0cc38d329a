const ground =
  'M0 98C45 95 80 101 122 103L306 118V146H346V124C410 148 462 214 540 250C612 282 662 288 716 326C742 344 760 352 786 353H864V372H910V353L1160 358'
const pipe = 'M342 133C408 158 460 222 538 258C610 290 660 296 712 333C734 348 752 352 772 347'
const branch = 'M770 347C788 342 796 334 826 334'
const buckets = Array.from({ length: 12 }, (_, bucket) => (
  <path key={bucket} d="M888 300V295" transform={`rotate(${bucket * 30} 888 318)`} />
))

/** The ids are the page's: one set of definitions serves every picture in it. */
export const sectionId = 'long-section'
const hatchId = 'long-section-hatch'

/** The scheme in long section, drawn once and shown whole or in slices. No words: those are set for each picture. */
export function SectionDefinitions() {
  return (
    <svg width="0" height="0" className="section-definitions" aria-hidden="true">
      <defs>
        <pattern id={hatchId} width="9" height="9" patternUnits="userSpaceOnUse" patternTransform="rotate(52)">
          <path d="M0 0V9" stroke="var(--earth)" opacity=".45" />
        </pattern>
        <g id={sectionId} fill="none" stroke="var(--ink)" strokeWidth="2.5">
          <g stroke="none">
            <path d={`${ground}V428H0Z`} fill="var(--earth-fill)" />
            <path d={`${ground}V428H0Z`} fill={`url(#${hatchId})`} />
          </g>
          <g stroke="none" fill="var(--water-fill)">
            <path d="M0 84C40 82 80 88 118 88V103C80 101 45 95 0 98Z" />
            <path d="M122 95L306 110H345V145H307V118L122 103Z" />
            <path d="M865 360H909V371H865Z" />
          </g>
          <path d={ground} stroke="var(--earth)" />
          <path d="M0 84C40 82 80 88 118 88M122 95L306 110H346M865 360H909" stroke="var(--water)" />
          <path d="M120 83V110" strokeWidth="4" />
          <path d="M326 113L338 144" strokeWidth="2" strokeDasharray="3 3" />

          <path d="M346 110H852" stroke="var(--water)" strokeWidth="1.5" strokeDasharray="3 6" />
          <path d="M346 114L700 128L792 138L840 156" stroke="var(--water)" />
          <path d="M852 110V156M847 110H857M847 156H857" stroke="var(--rust)" strokeWidth="1.5" />

          <path d="M772 353V268L886 222L1000 268V354" fill="var(--paper)" />
          <path d={pipe} strokeWidth="9" />
          <path d={pipe} strokeWidth="5" stroke="var(--water-fill)" />
          <path d={branch} strokeWidth="8" />
          <path d={branch} strokeWidth="4" stroke="var(--water-fill)" />
          <g fill="var(--paper)" strokeWidth="2">
            <path d="M790 340V301" />
            <circle cx="790" cy="291" r="11" />
            <path d="M790 291L796 285" />
            <path d="M804 327L820 341V327L804 341Z" />
          </g>
          <path d="M826 327L848 331V337L826 341Z" fill="var(--ink)" stroke="none" />
          <path d="M848 334H876" stroke="var(--water)" strokeWidth="4" />
          <path
            d="M880 342V358M887 344V358M894 342V358"
            stroke="var(--water)"
            strokeWidth="1.5"
            strokeDasharray="3 4"
          />
          <circle cx="888" cy="318" r="18" />
          {buckets}
          <path d="M888 318H930" strokeWidth="3" />
          <circle cx="888" cy="318" r="3" fill="var(--ink)" stroke="none" />
          <rect x="930" y="303" width="36" height="30" rx="2" fill="var(--paper)" />
          <path d="M936 333V353M960 333V353" />

          <path d="M966 312H1016C1034 312 1026 394 1044 394H1074C1090 394 1094 378 1096 358" stroke="var(--brass)" />
          <path d="M1088 357V306L1120 282L1152 306V358" fill="var(--paper)" />
          <rect x="1110" y="318" width="20" height="18" fill="var(--brass-fill)" strokeWidth="2" />
        </g>
      </defs>
    </svg>
  )
}
