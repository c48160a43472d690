%
(Title: Counting wheel of a toy clock)
(Mark 8BACBE9F, made by Ogive, version golden)
(Walk-round program, to be run first, spindle still)
(Part: wheel of 7 teeth, module 1, for a pinion of 6 leaves, 0.00591 inch or 0.15 mm thick, bore)
(0.06299 inch or 1.6 mm, no crossings)
(Machine file inch-bench-mill, not yet proved on a machine)
(Units: INCHES. To check: the diameter over the tips is 0.3591 inch or 9.121 mm)
(Blank: sheet 0.62992 inch by 0.55118 inch, 0.00591 inch thick, in mm 16 by 14 by 0.15, its middle)
(at zero. Material: leaded-brass. Held by glue)
(Spindle: stays still)
(Zero of X and Y: the axis of the wheel. Zero of height: the top of the blank. All three are kept)
(in the first work offset. To find it again: the edges of the sheet lie at X=-0.31496 inch and)
(Y=-0.27559 inch, and stay there, touch them and write down what the machine shows)
(The middle of the cutter reaches in X from -0.3150 inch to 0.2505 inch, in Y from -0.2362 inch to)
(0.2756 inch, in height from 0.1969 inch to 0.7874 inch. Clear height 0.1969 inch)
(Park before the start: X=-0.3150 inch, Y=0.2756 inch, height 0.7874 inch)
(Proved: read back from its own text: travel, keep-outs, nothing below the clear height, spindle)
(still)
(Not proved: whether zero is set where it says, and what stands on the table without being named in)
(the job)
(CAUTION. A mill can maim. Only a trained person runs this, and the rules of the place and the book)
(of the machine come before every word here)
(Whoever presses start answers for it: the writer of this program has not seen your machine, your)
(cutters or your set-up. Read it through first)
(That a controller takes a program says nothing of its safety: few check their travel, and none)
(sees a clamp)
(The machine file has not been proved on a real machine: run this in the air, block by block,)
(before anything else)
(This program turns no spindle and goes round at height 0.1969 inch, never below it. Switch off the)
(power of the spindle, have the first cutter in and its height touched off, a hand on feed hold:)
(watch that the cutter passes over or round everything that stands on the table)
(Before the start park the cutter at X=-0.3150 inch, Y=0.2756 inch, at height 0.7874 inch or above,)
(with nothing between it and the clear height 0.1969 inch)
(Set zero with care, then move by hand to X=0, Y=0 and the clear height 0.1969 inch and look)
(whether the place is right. Take off shifts, turns, scales and mirrors left by earlier work)
(The lowest point is height 0.1969 inch. Compare all the reaches above with clamps, screws, vice,)
(table edges and the ends of travel)
(The words are in INCHES. A part that measures anything but 0.3591 inch or 9.121 mm at the diameter)
(over the tips is in the wrong unit or badly set: stop)
(The blank is held by glue: pull at it before the start, and keep every clamp outside the reaches)
(above or named in the job)
(End of the cautions)
N10 G20 G17 G40 G49 G54 G61 G80 G90 G94 G98
(walk-round: the spindle stays still, watch the cutter, the clamps and the nut)
N20 G53 G00 Z0
(Cutter 1)
(its length must stand in the table of the machine under number 1 before the start: nothing stops)
(here to measure it)
N30 T1
N40 M06
N50 G20 G17 G40 G54 G61 G80 G90 G94 G98
N60 G43 H1
N70 G53 G00 Z0
N80 G00 X-.31496 Y.27559
N90 Z.7874
(Round the extents)
N100 X-.18384 Y-.1954
N110 Z.19685
N120 X.25046
N130 Y.1954
N140 X-.18384
N150 Y-.1954
(Over what stands in the way)
N160 X-.27559 Y-.23622
N170 Z.7874
N180 X-.31496 Y.27559
N190 G53 G00 Z0
N200 G49
N210 G61 G40 G80 G90 G94
N220 M30
%
