%
(Title: Counting wheel of a toy clock)
(Mark 8BACBE9F, made by Ogive, version golden)
(Cutting program, the only one)
(Part: wheel of 7 teeth, module 1, for a pinion of 6 leaves, 0.00591 inch or 0.15 mm thick, bore)
(0.06299 inch or 1.6 mm, no crossings)
(Machine file inch-bench-mill, not yet proved on a machine)
(Units: INCHES. To check: the diameter over the tips is 0.3591 inch or 9.121 mm)
(Blank: sheet 0.62992 inch by 0.55118 inch, 0.00591 inch thick, in mm 16 by 14 by 0.15, its middle)
(at zero. Material: leaded-brass. Held by glue)
(Cutter 1: cuts 0.0394 inch or 1.000 mm wide, 2 flutes, sticking out 0.5906 inch or 15.000 mm)
(Cutter 2: cuts 0.0315 inch or 0.800 mm wide, 2 flutes, sticking out 0.5118 inch or 13.000 mm)
(Spindle: clockwise seen from above the work, 20000 turns a minute)
(Zero of X and Y: the axis of the wheel. Zero of height: the top of the blank. All three are kept)
(in the first work offset. To find it again: the edges of the sheet lie at X=-0.31496 inch and)
(Y=-0.27559 inch, and stay there, touch them and write down what the machine shows)
(The middle of the cutter reaches in X from -0.3150 inch to 0.2505 inch, in Y from -0.1978 inch to)
(0.2756 inch, in height from -0.0079 inch to 0.7874 inch. Clear height 0.1969 inch)
(Park before the start: X=-0.3150 inch, Y=0.2756 inch, height 0.7874 inch)
(Proved: read back from its own text, all programs of this mark together: the flanks against the)
(exact curve at every depth, bore and crossings, travel, fast moves, keep-outs, feeds and spindle,)
(loose metal)
(Not proved: bending, wear and true running of the cutter, play of the slides, the holding, and)
(whether zero is set where it says)
(CAUTION. A mill can maim. Only a trained person runs this, and the rules of the place and the book)
(of the machine come before every word here)
(Whoever presses start answers for it: the writer of this program has not seen your machine, your)
(cutters or your set-up. Read it through first)
(That a controller takes a program says nothing of its safety: few check their travel, and none)
(sees a clamp)
(The machine file has not been proved on a real machine: run this in the air, block by block,)
(before anything else)
(Before the start park the cutter at X=-0.3150 inch, Y=0.2756 inch, at height 0.7874 inch or above,)
(with nothing between it and the clear height 0.1969 inch)
(Set zero with care, then move by hand to X=0, Y=0 and the clear height 0.1969 inch and look)
(whether the place is right. Take off shifts, turns, scales and mirrors left by earlier work)
(First run: raise the zero of height by 0.2047 inch, and parking with it, so that everything)
(happens in the air, rapid override low, a hand on feed hold. Then put the zero back and go block)
(by block down to the first cut)
(The lowest point is height -0.0079 inch, which is 0.0020 inch into what lies under the blank: let)
(that be waste. Compare all the reaches above with clamps, screws, vice, table edges and the ends)
(of travel. The reaches are those of the middle of the cutter: cutter and shank go 0.0625 inch)
(further to every side, and above height 0.5039 inch the collet nut goes 0.5512 inch further)
(The words are in INCHES. A part that measures anything but 0.3591 inch or 9.121 mm at the diameter)
(over the tips is in the wrong unit or badly set: stop)
(Cutter 1 must be the one of 0.0394 inch or 1.000 mm, clean in its collet, sticking out 0.5906 inch)
(or 15.000 mm and no more, its length measured again after fitting)
(Cutter 2 must be the one of 0.0315 inch or 0.800 mm, clean in its collet, sticking out 0.5118 inch)
(or 13.000 mm and no more, its length measured again after fitting)
(The blank is held by glue: pull at it before the start, and keep every clamp outside the reaches)
(above or named in the job)
(The spindle goes up to 20000 turns a minute: see that cutter, collet and nut are made for it, that)
(it turns the way the cutter cuts, the nut tight and the key out)
(Guards shut and their switches working. Never reach in, and take the power off the spindle before)
(hands go near a cutter. No gloves, loose cuffs, long hair, rings or chains near a turning spindle)
(Cutting fluid, where any is used: kept clean, off the skin, its mist out of the lungs)
(Wear glasses made for impact, as small cutters break and fly, and ear protection where the noise)
(asks for it)
(Know where the emergency stop is and try it first. After using it find the machine zero and the)
(work zero anew: the place may be lost)
(Stay with it. Listen, and stop when the sound changes: a broken cutter tells nobody, and the rest)
(of the program cuts air or worse)
(Make sure of the alloy: beryllium copper looks alike and is NOT brass. Its dust harms the lungs)
(for good. Where nobody can say what the sheet is, do not cut it)
(This metal holds lead, commonly 2 to 4 per cent in brass: do not eat, drink or smoke here, wipe)
(and do not blow, wash hands before anything else, keep the dust from home and children)
(The chips are fine fast needles, and no magnet gathers them: a shield in front, brush or vacuum)
(after, never fingers, never an air jet)
(Do not start in the middle of a program: a start there lacks units, feed, spindle and offset.)
(After a stop or a broken cutter check zero and length and run the whole program again from its)
(first line, through the air it has cut already)
(Measure with the spindle still and the machine held, burrs taken off first)
(End of the cautions)
N10 G20 G17 G40 G49 G54 G61 G80 G90 G94 G98
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
N100 S20000 M03
N110 G04 P5000
(Bore, lap 1 of 4, down to height -0.0005 inch)
N120 G00 X.00984 Y0
N130 Z.01969
N140 G01 Z.00197 F3.15
N150 G03 X-.00984 Y0 Z.00074 I-.00984 J0
N160 X.00984 Y0 Z-.00049 I.00984 J0
(Bore, lap 2 of 4, down to height -0.0030 inch)
N170 X-.00984 Y0 Z-.00172 I-.00984 J0
N180 X.00984 Y0 Z-.00295 I.00984 J0
(Bore, lap 3 of 4, down to height -0.0054 inch)
N190 X-.00984 Y0 Z-.00418 I-.00984 J0
N200 X.00984 Y0 Z-.00541 I.00984 J0
(Bore, lap 4 of 4, down to height -0.0079 inch)
N210 X-.00984 Y0 Z-.00664 I-.00984 J0
N220 X.00984 Y0 Z-.00787 I.00984 J0
N230 X-.00984 Y0 I-.00984 J0 F4.156
N240 X.00984 Y0 I.00984 J0
(Bore finishing, lap 1 of 1, down to height -0.0079 inch)
N250 G00 Z.19685
N260 X0
N270 Z.01969
N280 G01 Z-.00787 F18.898
N290 G03 X.01181 Y0 I.00591 J0 F7.021
N300 X-.01181 Y0 I-.01181 J0
N310 X.01181 Y0 I.01181 J0
N320 X.00928 Y.0073 I-.01181 J0
N330 X0 Y0 I-.00464 J-.00365
N340 G00 Z.7874
N350 M05
N360 X-.31496 Y.27559
N370 G53 G00 Z0
(Cutter 2)
(its length must stand in the table of the machine under number 2 before the start: nothing stops)
(here to measure it)
N380 T2
N390 M06
N400 G20 G17 G40 G54 G61 G80 G90 G94 G98
N410 G43 H2
N420 G53 G00 Z0
N430 G00 X-.31496 Y.27559
N440 Z.7874
N450 S20000 M03
N460 G04 P5000
(Bay, ring 1 of 2, lap 1 of 3, down to height -0.0013 inch)
N470 G00 X.23944 Y-.01088
N480 Z.01969
N490 G01 Z.00197 F2.362
N500 G03 X.21109 Y-.01088 Z.00033 I-.01417 J0
N510 X.23944 Y-.01088 Z-.00131 I.01418 J0
(Bay, ring 1 of 2, lap 2 of 3, down to height -0.0046 inch)
N520 X.21109 Y-.01088 Z-.00295 I-.01417 J0
N530 X.23944 Y-.01088 Z-.00459 I.01418 J0
(Bay, ring 1 of 2, lap 3 of 3, down to height -0.0079 inch)
N540 X.21109 Y-.01088 Z-.00623 I-.01417 J0
N550 X.23944 Y-.01088 Z-.00787 I.01418 J0
N560 X.21109 Y-.01088 I-.01417 J0 F4.452
N570 X.23944 Y-.01088 I.01418 J0
(Bay, ring 2 of 2, lap 1 of 2, down to height -0.0030 inch)
N580 G00 Z.01969
N590 G01 X.25046 F9.449
N600 Z.00197 F2.362
N610 G03 X.20007 Y-.01088 Z-.00049 I-.02519 J0 F5.759
N620 X.25046 Y-.01088 Z-.00295 I.0252 J0
(Bay, ring 2 of 2, lap 2 of 2, down to height -0.0079 inch)
N630 X.20007 Y-.01088 Z-.00541 I-.02519 J0
N640 X.25046 Y-.01088 Z-.00787 I.0252 J0
N650 X.20007 Y-.01088 I-.02519 J0
N660 X.25046 Y-.01088 I.0252 J0
(Roughing, lap 1 of 2, down to height -0.0079 inch)
N670 G00 Z.19685
N680 X.22527
N690 Z.01969
N700 G01 Z0 F2.362
N710 X.2181 Y.0132 F9.449
N720 G03 X.20225 Y-.00113 I-.00076 J-.01509
(Roughing, lap 1 of 2, down to height -0.0079 inch, tooth 1)
N730 G02 X.19715 Y-.01431 I-.02254 J.00113
N740 X.17278 Y-.03637 I-.08613 J.07067
N750 X.13981 Y-.04844 I-.0415 J.06231
N760 X.1304 Y-.04792 I-.00319 J.02777
N770 G01 X.08572 Y-.03773 Z-.00056
N780 G02 X.08294 Y-.0435 I-.08572 J.03773
(Roughing, lap 1 of 2, down to height -0.0079 inch, tooth 7)
N790 G01 X.11877 Y-.07207 Z-.00112
N800 G02 X.12504 Y-.0791 I-.01743 J-.02186
N810 X.13616 Y-.11241 I-.06347 J-.03971
N820 X.13411 Y-.14522 I-.111 J-.00952
N830 X.11174 Y-.16306 I-.02206 J.00472
N840 X.07929 Y-.15776 I.00154 J.1114
N850 X.04929 Y-.13951 I.02284 J.0713
N860 X.04384 Y-.13183 I.01973 J.01981
N870 G01 X.02395 Y-.09054 Z-.00169
N880 G02 X.0177 Y-.09197 I-.02395 J.09054
(Roughing, lap 1 of 2, down to height -0.0079 inch, tooth 6)
N890 G01 Y-.1378 Z-.00225
N900 G02 X.01612 Y-.14708 I-.02795 J0
N910 X-.00299 Y-.17654 I-.07062 J.02487
N920 X-.02992 Y-.1954 I-.07666 J.08085
N930 X-.05782 Y-.18903 I-.01007 J.02019
N940 X-.07391 Y-.16036 I.08806 J.06826
N950 X-.07834 Y-.12552 I.06999 J.0266
N960 X-.07574 Y-.11647 I.02779 J-.00308
N970 G01 X-.05586 Y-.07518 Z-.00281
N980 G02 X-.06087 Y-.07118 I.05586 J.07518
(Roughing, lap 1 of 2, down to height -0.0079 inch, tooth 5)
N990 G01 X-.09669 Y-.09976 Z-.00337
N1000 G02 X-.10494 Y-.1043 I-.01743 J.02186
N1010 X-.13989 Y-.10774 I-.02459 J.07071
N1020 X-.17142 Y-.09844 I.01541 J.11035
N1030 X-.18384 Y-.07265 I.00951 J.02047
N1040 X-.17145 Y-.0422 I.10827 J-.02629
N1050 X-.14698 Y-.01702 I.06443 J-.03813
N1060 X-.13828 Y-.0134 I.01492 J-.02364
N1070 G01 X-.0936 Y-.0032 Z-.00394
N1080 G02 X-.0936 Y.0032 I.0936 J.0032
(Roughing, lap 1 of 2, down to height -0.0079 inch, tooth 4)
N1090 G01 X-.13828 Y.0134 Z-.0045
N1100 G02 X-.14698 Y.01702 I.00622 J.02726
N1110 X-.17145 Y.0422 I.03996 J.06331
N1120 X-.18384 Y.07265 I.09588 J.05674
N1130 X-.17142 Y.09844 I.02193 J.00532
N1140 X-.13989 Y.10774 I.04694 J-.10105
N1150 X-.10494 Y.1043 I.01036 J-.07415
N1160 X-.09669 Y.09976 I-.00918 J-.0264
N1170 G01 X-.06087 Y.07118 Z-.00506
N1180 G02 X-.05586 Y.07518 I.06087 J-.07118
(Roughing, lap 1 of 2, down to height -0.0079 inch, tooth 3)
N1190 G01 X-.07574 Y.11647 Z-.00562
N1200 G02 X-.07834 Y.12552 I.02519 J.01213
N1210 X-.07391 Y.16036 I.07442 J.00824
N1220 X-.05782 Y.18903 I.10415 J-.03959
N1230 X-.02992 Y.1954 I.01783 J-.01382
N1240 X-.00299 Y.17654 I-.04973 J-.09971
N1250 X.01612 Y.14708 I-.05151 J-.05433
N1260 X.0177 Y.1378 I-.02637 J-.00928
N1270 G01 Y.09197 Z-.00619
N1280 G02 X.02395 Y.09054 I-.0177 J-.09197
(Roughing, lap 1 of 2, down to height -0.0079 inch, tooth 2)
N1290 G01 X.04384 Y.13183 Z-.00675
N1300 G02 X.04929 Y.13951 I.02518 J-.01213
N1310 X.07929 Y.15776 I.05284 J-.05305
N1320 X.11174 Y.16306 I.03399 J-.1061
N1330 X.13411 Y.14522 I.00031 J-.02256
N1340 X.13616 Y.11241 I-.10895 J-.02329
N1350 X.12504 Y.0791 I-.07459 J.0064
N1360 X.11877 Y.07207 I-.0237 J.01483
N1370 G01 X.08294 Y.0435 Z-.00731
N1380 G02 X.08572 Y.03773 I-.08294 J-.0435
(Roughing, lap 1 of 2, down to height -0.0079 inch, tooth 1 again)
N1390 G01 X.1304 Y.04792 Z-.00787
N1400 G02 X.13981 Y.04844 I.00622 J-.02725
N1410 X.17278 Y.03637 I-.00853 J-.07438
N1420 X.19715 Y.01431 I-.06176 J-.09273
N1430 X.20225 Y-.00113 I-.01744 J-.01431
(Roughing, lap 2 of 2, down to height -0.0079 inch, tooth 1)
N1440 X.19715 Y-.01431 I-.02254 J.00113
N1450 X.17278 Y-.03637 I-.08613 J.07067
N1460 X.13981 Y-.04844 I-.0415 J.06231
N1470 X.1304 Y-.04792 I-.00319 J.02777
N1480 G01 X.08572 Y-.03773
N1490 G02 X.08294 Y-.0435 I-.08572 J.03773
(Roughing, lap 2 of 2, down to height -0.0079 inch, tooth 7)
N1500 G01 X.11877 Y-.07207
N1510 G02 X.12504 Y-.0791 I-.01743 J-.02186
N1520 X.13616 Y-.11241 I-.06347 J-.03971
N1530 X.13411 Y-.14522 I-.111 J-.00952
N1540 X.11174 Y-.16306 I-.02206 J.00472
N1550 X.07929 Y-.15776 I.00154 J.1114
N1560 X.04929 Y-.13951 I.02284 J.0713
N1570 X.04384 Y-.13183 I.01973 J.01981
N1580 G01 X.02395 Y-.09054
N1590 G02 X.0177 Y-.09197 I-.02395 J.09054
(Roughing, lap 2 of 2, down to height -0.0079 inch, tooth 6)
N1600 G01 Y-.1378
N1610 G02 X.01612 Y-.14708 I-.02795 J0
N1620 X-.00299 Y-.17654 I-.07062 J.02487
N1630 X-.02992 Y-.1954 I-.07666 J.08085
N1640 X-.05782 Y-.18903 I-.01007 J.02019
N1650 X-.07391 Y-.16036 I.08806 J.06826
N1660 X-.07834 Y-.12552 I.06999 J.0266
N1670 X-.07574 Y-.11647 I.02779 J-.00308
N1680 G01 X-.05586 Y-.07518
N1690 G02 X-.06087 Y-.07118 I.05586 J.07518
(Roughing, lap 2 of 2, down to height -0.0079 inch, tooth 5)
N1700 G01 X-.09669 Y-.09976
N1710 G02 X-.10494 Y-.1043 I-.01743 J.02186
N1720 X-.13989 Y-.10774 I-.02459 J.07071
N1730 X-.17142 Y-.09844 I.01541 J.11035
N1740 X-.18384 Y-.07265 I.00951 J.02047
N1750 X-.17145 Y-.0422 I.10827 J-.02629
N1760 X-.14698 Y-.01702 I.06443 J-.03813
N1770 X-.13828 Y-.0134 I.01492 J-.02364
N1780 G01 X-.0936 Y-.0032
N1790 G02 X-.0936 Y.0032 I.0936 J.0032
(Roughing, lap 2 of 2, down to height -0.0079 inch, tooth 4)
N1800 G01 X-.13828 Y.0134
N1810 G02 X-.14698 Y.01702 I.00622 J.02726
N1820 X-.17145 Y.0422 I.03996 J.06331
N1830 X-.18384 Y.07265 I.09588 J.05674
N1840 X-.17142 Y.09844 I.02193 J.00532
N1850 X-.13989 Y.10774 I.04694 J-.10105
N1860 X-.10494 Y.1043 I.01036 J-.07415
N1870 X-.09669 Y.09976 I-.00918 J-.0264
N1880 G01 X-.06087 Y.07118
N1890 G02 X-.05586 Y.07518 I.06087 J-.07118
(Roughing, lap 2 of 2, down to height -0.0079 inch, tooth 3)
N1900 G01 X-.07574 Y.11647
N1910 G02 X-.07834 Y.12552 I.02519 J.01213
N1920 X-.07391 Y.16036 I.07442 J.00824
N1930 X-.05782 Y.18903 I.10415 J-.03959
N1940 X-.02992 Y.1954 I.01783 J-.01382
N1950 X-.00299 Y.17654 I-.04973 J-.09971
N1960 X.01612 Y.14708 I-.05151 J-.05433
N1970 X.0177 Y.1378 I-.02637 J-.00928
N1980 G01 Y.09197
N1990 G02 X.02395 Y.09054 I-.0177 J-.09197
(Roughing, lap 2 of 2, down to height -0.0079 inch, tooth 2)
N2000 G01 X.04384 Y.13183
N2010 G02 X.04929 Y.13951 I.02518 J-.01213
N2020 X.07929 Y.15776 I.05284 J-.05305
N2030 X.11174 Y.16306 I.03399 J-.1061
N2040 X.13411 Y.14522 I.00031 J-.02256
N2050 X.13616 Y.11241 I-.10895 J-.02329
N2060 X.12504 Y.0791 I-.07459 J.0064
N2070 X.11877 Y.07207 I-.0237 J.01483
N2080 G01 X.08294 Y.0435
N2090 G02 X.08572 Y.03773 I-.08294 J-.0435
(Roughing, lap 2 of 2, down to height -0.0079 inch, tooth 1 again)
N2100 G01 X.1304 Y.04792
N2110 G02 X.13981 Y.04844 I.00622 J-.02725
N2120 X.17278 Y.03637 I-.00853 J-.07438
N2130 X.19715 Y.01431 I-.06176 J-.09273
N2140 X.20225 Y-.00113 I-.01744 J-.01431
(Roughing, lap 2 of 2, down to height -0.0079 inch)
N2150 X.20114 Y-.00706 I-.02254 J.00113
N2160 G03 X.21076 Y-.02615 I.01436 J-.00474
N2170 G01 X.22527 Y-.01088
(Finishing, lap 1 of 1, down to height -0.0079 inch)
N2180 G00 Z.01969
N2190 G01 Z-.00787 F14.173
N2200 X.21505 Y.01047
N2210 G03 X.19919 Y-.00387 I-.00076 J-.0151
(Finishing, lap 1 of 1, down to height -0.0079 inch, tooth 1)
N2220 G02 X.19564 Y-.01307 I-.01572 J.00079
N2230 X.17567 Y-.03203 I-.0857 J.07031
N2240 X.15162 Y-.04422 I-.04854 J.06593
N2250 X.13542 Y-.04657 I-.0154 J.04911
N2260 X.13084 Y-.04602 I.00035 J.02215
N2270 G01 X.09225 Y-.03721
N2280 X.08457 Y-.03546 F6.327
N2290 G02 X.08045 Y-.04401 I-.08457 J.03546
(Finishing, lap 1 of 1, down to height -0.0079 inch, tooth 7)
N2300 G01 X.11755 Y-.0736 F14.173
N2310 G02 X.12084 Y-.07684 I-.01381 J-.01732
N2320 X.1291 Y-.09097 I-.03973 J-.03271
N2330 X.13456 Y-.11737 I-.07634 J-.02956
N2340 X.1322 Y-.14481 I-.11076 J-.00427
N2350 X.12682 Y-.15366 I-.0154 J.00329
N2360 X.12159 Y-.15784 I-.12682 J.15366
N2370 X.11176 Y-.16111 I-.00961 J.01248
N2380 X.08449 Y-.15731 I.00154 J.11084
N2390 X.05996 Y-.14611 I.02127 J.07905
N2400 X.04803 Y-.13491 I.0288 J.04266
N2410 X.0456 Y-.13098 I.01753 J.01354
N2420 G01 X.02842 Y-.09532
N2430 X.02501 Y-.08822 F6.327
N2440 G02 X.01575 Y-.09034 I-.02501 J.08822
(Finishing, lap 1 of 1, down to height -0.0079 inch, tooth 6)
N2450 G01 Y-.1378 F14.173
N2460 G02 X.01527 Y-.14239 I-.02216 J0
N2470 X.00937 Y-.15766 I-.05035 J.01067
N2480 X-.00787 Y-.17839 I-.0707 J.04126
N2490 X-.03079 Y-.19364 I-.0724 J.08394
N2500 X-.04107 Y-.19496 I-.00703 J.01409
N2510 X-.04759 Y-.19347 I.04107 J.19496
N2520 X-.05628 Y-.18783 I.00376 J.01529
N2530 X-.07031 Y-.16414 I.08762 J.06791
N2540 X-.07685 Y-.13798 I.07507 J.03266
N2550 X-.07553 Y-.12166 I.05131 J.00408
N2560 X-.07398 Y-.11732 I.02151 J-.00527
N2570 G01 X-.0568 Y-.08165
N2580 X-.05338 Y-.07456 F6.327
N2590 G02 X-.06081 Y-.06864 I.05338 J.07456
(Finishing, lap 1 of 1, down to height -0.0079 inch, tooth 5)
N2600 G01 X-.09791 Y-.09823 F14.173
N2610 G02 X-.10181 Y-.10071 I-.01382 J.01732
N2620 X-.11742 Y-.10562 I-.02305 J.04602
N2630 X-.14437 Y-.10507 I-.01183 J.081
N2640 X-.1706 Y-.09666 I.02048 J.10894
N2650 X-.17803 Y-.08945 I.00664 J.01428
N2660 X-.18094 Y-.08342 I.17803 J.08945
N2670 X-.18194 Y-.07311 I.01431 J.00659
N2680 X-.17216 Y-.04737 I.10772 J-.02616
N2690 X-.15579 Y-.02595 I.07233 J-.03833
N2700 X-.14222 Y-.0168 I.03518 J-.03756
N2710 X-.13784 Y-.01531 I.0093 J-.02011
N2720 G01 X-.09925 Y-.0065
N2730 X-.09158 Y-.00475 F6.327
N2740 G02 X-.09158 Y.00475 I.09158 J.00475
(Finishing, lap 1 of 1, down to height -0.0079 inch, tooth 4)
N2750 G01 X-.13784 Y.01531 F14.173
N2760 G02 X-.14222 Y.0168 I.00492 J.0216
N2770 X-.15579 Y.02595 I.02161 J.04671
N2780 X-.17216 Y.04737 I.05596 J.05975
N2790 X-.18194 Y.07311 I.09794 J.0519
N2800 X-.18094 Y.08342 I.01531 J.00372
N2810 X-.17803 Y.08945 I.18094 J-.08342
N2820 X-.1706 Y.09666 I.01407 J-.00707
N2830 X-.14437 Y.10507 I.04671 J-.10053
N2840 X-.11742 Y.10562 I.01512 J-.08045
N2850 X-.10181 Y.10071 I-.00744 J-.05093
N2860 X-.09791 Y.09823 I-.00992 J-.0198
N2870 G01 X-.06697 Y.07355
N2880 X-.06081 Y.06864 F6.327
N2890 G02 X-.05338 Y.07456 I.06081 J-.06864
(Finishing, lap 1 of 1, down to height -0.0079 inch, tooth 3)
N2900 G01 X-.07398 Y.11732 F14.173
N2910 G02 X-.07553 Y.12166 I.01996 J.00961
N2920 X-.07685 Y.13798 I.04999 J.01224
N2930 X-.07031 Y.16414 I.08161 J-.0065
N2940 X-.05628 Y.18783 I.10165 J-.04422
N2950 X-.04759 Y.19347 I.01245 J-.00965
N2960 X-.04107 Y.19496 I.04759 J-.19347
N2970 X-.03079 Y.19364 I.00325 J-.01541
N2980 X-.00787 Y.17839 I-.04948 J-.09919
N2990 X.00937 Y.15766 I-.05346 J-.06199
N3000 X.01527 Y.14239 I-.04445 J-.02594
N3010 X.01575 Y.1378 I-.02168 J-.00459
N3020 G01 Y.09821
N3030 Y.09034 F6.327
N3040 G02 X.02501 Y.08822 I-.01575 J-.09034
(Finishing, lap 1 of 1, down to height -0.0079 inch, tooth 2)
N3050 G01 X.0456 Y.13098 F14.173
N3060 G02 X.04803 Y.13491 I.01996 J-.00961
N3070 X.05996 Y.14611 I.04073 J-.03146
N3080 X.08449 Y.15731 I.0458 J-.06785
N3090 X.11176 Y.16111 I.02881 J-.10704
N3100 X.12159 Y.15784 I.00022 J-.01575
N3110 X.12682 Y.15366 I-.12159 J-.15784
N3120 X.1322 Y.14481 I-.01002 J-.01214
N3130 X.13456 Y.11737 I-.1084 J-.02317
N3140 X.1291 Y.09097 I-.0818 J.00316
N3150 X.12084 Y.07684 I-.04799 J.01858
N3160 X.11755 Y.0736 I-.0171 J.01408
N3170 G01 X.0866 Y.04892
N3180 X.08045 Y.04401 F6.327
N3190 G02 X.08457 Y.03546 I-.08045 J-.04401
(Finishing, lap 1 of 1, down to height -0.0079 inch, tooth 1 again)
N3200 G01 X.13084 Y.04602 F14.173
N3210 G02 X.13542 Y.04657 I.00493 J-.0216
N3220 X.15162 Y.04422 I.0008 J-.05146
N3230 X.17567 Y.03203 I-.02449 J-.07812
N3240 X.19564 Y.01307 I-.06573 J-.08927
N3250 X.19921 Y.00335 I-.01217 J-.00999
N3260 X.19921 Y-.00335 I-.19921 J-.00335
N3270 G01 X.19919 Y-.00387
(Finishing, lap 1 of 1, down to height -0.0079 inch)
N3280 G02 X.19842 Y-.00801 I-.01572 J.00079
N3290 G03 X.20805 Y-.0271 I.01436 J-.00473
N3300 G01 X.22527 Y-.01088
N3310 G00 Z.7874
N3320 M05
N3330 X-.31496 Y.27559
N3340 G53 G00 Z0
N3350 G49
N3360 G61 G40 G80 G90 G94
N3370 M30
%
